import { Badge } from '../../components/badge.tsx';
import { Page } from '../../components/page.tsx';
import { useSignedIn } from './api/use-signed-in.ts';

export const Component = () => {
  const { data: signedIn } = useSignedIn();
  if (!signedIn) return null;
  const { person, memberships, organisation: current } = signedIn;
  return (
    <Page title="Account" isNarrow>
      <dl className="grid grid-cols-[110px_1fr] gap-x-4 gap-y-2">
        <dt className="text-ink-2">Name</dt>
        <dd className="font-semibold">{person.name}</dd>
        <dt className="text-ink-2">E-mail</dt>
        <dd className="min-w-0 font-semibold break-all">{person.email}</dd>
      </dl>
      <section aria-labelledby="memberships" className="grid gap-3">
        <h2 id="memberships" className="text-xl font-bold">
          Where you work
        </h2>
        <ul className="grid divide-y divide-line rounded-md border border-line bg-sheet">
          {memberships.map(({ organisation, role }) => (
            <li key={organisation.id} className="flex flex-wrap items-center gap-3 px-4 py-3">
              <span className="font-semibold">{organisation.name}</span>
              <span className="text-ink-2">{role}</span>
              {organisation.id === current.id ? <Badge kind="plain">working here now</Badge> : null}
            </li>
          ))}
        </ul>
        <p className="text-sm text-ink-2">
          Switch between organisations in the menu under your name. An administrator changes your
          role.
        </p>
      </section>
    </Page>
  );
};
