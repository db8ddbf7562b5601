import { Link, NavLink } from 'react-router-dom';
import type { SignedIn } from '../../shared/contracts/accounts.ts';
import { Disclosure } from '../components/disclosure.tsx';
import { menuItemClasses } from '../components/menu-item-classes.ts';
import { useSignOut } from '../features/account/api/use-sign-out.ts';
import { useWorkIn } from '../features/account/api/use-work-in.ts';
import { placesOf } from './navigation.ts';

const Others = ({ signedIn }: { signedIn: SignedIn }) => {
  const workIn = useWorkIn();
  const others = signedIn.memberships.filter(
    ({ organisation }) => organisation.id !== signedIn.organisation.id,
  );
  if (others.length === 0) return null;
  return (
    <div className="border-t border-line pt-1.5">
      {others.map(({ organisation, role }) => (
        <button
          key={organisation.id}
          type="button"
          className={menuItemClasses}
          onClick={() => workIn.mutate(organisation.id)}
        >
          Work in {organisation.name} as {role}
        </button>
      ))}
    </div>
  );
};

/** Who is signed in and where; the pages as well, where the header has no room for them. */
export const AccountMenu = ({ signedIn }: { signedIn: SignedIn }) => {
  const signOut = useSignOut();
  return (
    <Disclosure label={signedIn.person.name}>
      <p className="px-3 pt-1 pb-1.5 text-sm text-ink-2">
        {signedIn.role} in {signedIn.organisation.name}
      </p>
      <div className="border-t border-line pt-1.5 md:hidden">
        {placesOf[signedIn.role].map(({ to, name }) => (
          <NavLink key={to} to={to} className={menuItemClasses}>
            {name}
          </NavLink>
        ))}
      </div>
      <Others signedIn={signedIn} />
      <div className="border-t border-line pt-1.5">
        <Link to="/account" className={menuItemClasses}>
          Account
        </Link>
        <button type="button" className={menuItemClasses} onClick={() => signOut.mutate()}>
          Sign out
        </button>
      </div>
    </Disclosure>
  );
};
