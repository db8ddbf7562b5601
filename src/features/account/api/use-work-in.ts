import { useMutation } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { homeOf } from '../../../app/navigation.ts';
import { call } from '../../../api/call.ts';
import { workIn } from '../../../../shared/contracts/accounts.ts';
import { useChangeOfPerson } from './use-change-of-person.ts';

/** Goes on working in another of one's organisations, from the start page of the role there. */
export const useWorkIn = () => {
  const change = useChangeOfPerson();
  const navigate = useNavigate();
  return useMutation({
    mutationFn: (organisation: string) => call(workIn, { body: { organisation } }),
    onSuccess: async ({ signedIn }) => {
      change(signedIn);
      await navigate(homeOf(signedIn.role));
    },
  });
};
