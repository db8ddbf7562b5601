import { useMutation, useQueryClient } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { changeRole, type Person } from '../../../../shared/contracts/people.ts';
import type { Role } from '../../../../shared/contracts/fields.ts';

export const useChangeRole = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: async ({ person, role }: { person: string; role: Role }) =>
      (await call(changeRole, { params: { person }, body: { role } })).person,
    onSuccess: (changed) =>
      queries.setQueryData<Person[]>(['people'], (people) =>
        people?.map((person) => (person.id === changed.id ? changed : person)),
      ),
  });
};
