import { useMutation } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { signOut } from '../../../../shared/contracts/accounts.ts';
import { useChangeOfPerson } from './use-change-of-person.ts';

export const useSignOut = () => {
  const change = useChangeOfPerson();
  return useMutation({
    mutationFn: () => call(signOut, {}),
    onSuccess: () => change(null),
  });
};
