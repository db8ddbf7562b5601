import { useMutation } from '@tanstack/react-query';
import { call, type CallInput } from '../../../api/call.ts';
import { signIn } from '../../../../shared/contracts/accounts.ts';
import { useChangeOfPerson } from './use-change-of-person.ts';

export const useSignIn = () => {
  const change = useChangeOfPerson();
  return useMutation({
    mutationFn: (body: CallInput<typeof signIn>['body']) => call(signIn, { body }),
    onSuccess: ({ signedIn }) => change(signedIn),
  });
};
