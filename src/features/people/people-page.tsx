import { useMemo, useState } from 'react';
import type { Role } from '../../../shared/contracts/fields.ts';
import type { Person } from '../../../shared/contracts/people.ts';
import { DateText } from '../../components/date-text.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import type { Column } from '../../components/table/column.ts';
import { DataTable } from '../../components/table/data-table.tsx';
import { useSortInUrl } from '../../components/table/use-sort-in-url.ts';
import { useSignedIn } from '../account/api/use-signed-in.ts';
import { useChangeRole } from './api/use-change-role.ts';
import { usePeople } from './api/use-people.ts';
import { RoleDialog } from './components/role-dialog.tsx';
import { RoleSelect } from './components/role-select.tsx';

type Choose = (choice: { person: Person; role: Role }) => void;

const columnsWith = (choose: Choose): readonly Column<Person>[] => [
  {
    id: 'name',
    header: 'Name',
    value: ({ name }) => name,
    cell: ({ name }) => <span className="font-semibold">{name}</span>,
  },
  {
    id: 'email',
    header: 'E-mail',
    value: ({ email }) => email,
    cell: ({ email }) => <span className="break-all">{email}</span>,
  },
  {
    id: 'role',
    header: 'Role',
    value: ({ role }) => role,
    cell: (person) => <RoleSelect person={person} onChoose={(role) => choose({ person, role })} />,
  },
  {
    id: 'joined',
    header: 'Joined',
    value: ({ joinedAt }) => Date.parse(joinedAt),
    cell: ({ joinedAt }) => <DateText at={joinedAt} />,
  },
  { id: 'attempts', header: 'Attempts', value: ({ attempts }) => attempts, isNumber: true },
];

const PeopleTable = ({ people }: { people: readonly Person[] }) => {
  const [choice, setChoice] = useState<{ person: Person; role: Role } | null>(null);
  const { data: signedIn } = useSignedIn();
  const change = useChangeRole();
  const [sort, setSort] = useSortInUrl('name');
  const columns = useMemo(() => columnsWith(setChoice), []);
  const close = (): void => {
    setChoice(null);
    change.reset();
  };
  return (
    <>
      <DataTable
        caption="People of this organisation"
        columns={columns}
        rows={people}
        rowId={({ id }) => id}
        sort={sort}
        onSort={setSort}
      />
      {choice ? (
        <RoleDialog
          {...choice}
          isOwn={signedIn?.person.id === choice.person.id}
          change={change}
          onClose={close}
        />
      ) : null}
    </>
  );
};

export const Component = () => {
  const query = usePeople();
  return (
    <Page title="People" lead="Who belongs to your organisation, and what each may do.">
      {query.isPending ? (
        <Loading what="the people" />
      ) : query.isError ? (
        <Failed what="The people" problem={query.error} retry={() => void query.refetch()} />
      ) : query.data.length === 0 ? (
        <EmptyState title="Nobody is here yet.">
          People join by creating an account. They then stand in this table.
        </EmptyState>
      ) : (
        <PeopleTable people={query.data} />
      )}
    </Page>
  );
};
