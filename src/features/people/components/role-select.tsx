import { role, type Role } from '../../../../shared/contracts/fields.ts';
import type { Person } from '../../../../shared/contracts/people.ts';
import { controlClasses } from '../../../components/control-classes.ts';

interface Props {
  person: Person;
  onChoose: (role: Role) => void;
}

/** Shows the role that is in force: choosing another only asks, the dialog changes it. */
export const RoleSelect = ({ person, onChoose }: Props) => (
  <select
    aria-label={`Role of ${person.name}`}
    className={`${controlClasses} max-w-[180px]`}
    value={person.role}
    onChange={({ target }) => onChoose(role.parse(target.value))}
  >
    {role.options.map((name) => (
      <option key={name}>{name}</option>
    ))}
  </select>
);
