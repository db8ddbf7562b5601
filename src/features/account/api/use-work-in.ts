import { useMutation } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { workIn } from '../../../../shared/contracts/accounts.ts';
import { useChangeOfPerson } from './use-change-of-person.ts';

export const useWorkIn = () => {
  const change = useChangeOfPerson();
  return useMutation({
    mutationFn: (organisation: string) => call(workIn, { body: { organisation } }),
    onSuccess: ({ signedIn }) => change(signedIn),
  });
};
