import { useMutation } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { call } from '../../../api/call.ts';
import { signOut } from '../../../../shared/contracts/accounts.ts';
import { useChangeOfPerson } from './use-change-of-person.ts';

export const useSignOut = () => {
  const change = useChangeOfPerson();
  const navigate = useNavigate();
  return useMutation({
    mutationFn: () => call(signOut, {}),
    onSuccess: async () => {
      change(null);
      await navigate('/');
    },
  });
};
