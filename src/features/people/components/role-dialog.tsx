import type { Role } from '../../../../shared/contracts/fields.ts';
import type { Person } from '../../../../shared/contracts/people.ts';
import { Ask } from '../../../components/ask.tsx';
import { FormProblem } from '../../account/components/form-problem.tsx';
import type { useChangeRole } from '../api/use-change-role.ts';

const article = (role: Role): string => (role === 'trainee' ? 'a trainee' : `an ${role}`);

const does: Record<Role, string> = {
  trainee: 'take jobs and read the debriefs of their own attempts',
  instructor: 'write and publish scenarios and read every attempt of the organisation',
  administrator: 'change the roles of people and read every attempt of the organisation',
};

interface Props {
  person: Person;
  role: Role;
  isOwn: boolean;
  change: ReturnType<typeof useChangeRole>;
  onClose: () => void;
}

export const RoleDialog = ({ person, role, isOwn, change, onClose }: Props) => (
  <Ask
    title={`Make ${person.name} ${article(role)}?`}
    confirm={`Make ${article(role)}`}
    cancel={`Leave as ${person.role}`}
    busy={change.isPending && 'Changing the role'}
    onConfirm={() => change.mutate({ person: person.id, role }, { onSuccess: onClose })}
    onCancel={onClose}
  >
    <p>
      {person.name} is {article(person.role)} now. As {article(role)} they can {does[role]}.
    </p>
    {isOwn ? <p className="font-semibold">This is you: you may lose this page at once.</p> : null}
    <FormProblem problem={change.error} />
  </Ask>
);
