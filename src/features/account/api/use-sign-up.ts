import { useMutation } from '@tanstack/react-query';
import { call, type CallInput } from '../../../api/call.ts';
import { signUp } from '../../../../shared/contracts/accounts.ts';
import { useChangeOfPerson } from './use-change-of-person.ts';

export const useSignUp = () => {
  const change = useChangeOfPerson();
  return useMutation({
    mutationFn: (body: CallInput<typeof signUp>['body']) => call(signUp, { body }),
    onSuccess: ({ signedIn }) => change(signedIn),
  });
};
