import { lazy, Suspense } from 'react';
import { Link, NavLink, useLocation } from 'react-router-dom';
import { Brand } from '../components/brand.tsx';
import { ButtonLink } from '../components/button-link.tsx';
import { useSignedIn } from '../features/account/api/use-signed-in.ts';
import { signedInBefore } from '../features/account/signed-in-before.ts';
import { homeOf, placesOf } from './navigation.ts';

const placeClasses =
  'flex h-[52px] items-center border-b-[3px] border-transparent px-3 pt-[3px] font-semibold text-ink-2 ' +
  'hover:text-act aria-[current=page]:border-act aria-[current=page]:text-ink ' +
  // Forced colours draw a transparent border too, and every page would look like the current one.
  'forced-colors:border-[Canvas] forced-colors:aria-[current=page]:border-[Highlight]';

const Visitor = () => (
  <>
    <ButtonLink to="/sign-in" look="quiet" isSmall>
      Sign in
    </ButtonLink>
    <span className="hidden sm:block">
      <ButtonLink to="/sign-up" isSmall>
        Create an account
      </ButtonLink>
    </span>
  </>
);

const AccountMenu = lazy(async () => {
  const { AccountMenu: loaded } = await import('./account-menu.tsx');
  return { default: loaded };
});

export const Header = () => {
  const isStart = useLocation().pathname === '/';
  const isAsked = !isStart || signedInBefore();
  const { data: signedIn, isSuccess } = useSignedIn(isAsked);
  return (
    <header className="flex h-[52px] items-center gap-4 border-b border-line bg-sheet px-4">
      <Link
        to={signedIn ? homeOf(signedIn.role) : '/'}
        aria-label="Coldbench, start"
        className="rounded"
      >
        <Brand />
      </Link>
      {signedIn ? (
        <nav aria-label="Pages" className="ml-2 hidden md:flex">
          {placesOf[signedIn.role].map(({ to, name }) => (
            <NavLink key={to} to={to} className={placeClasses}>
              {name}
            </NavLink>
          ))}
        </nav>
      ) : null}
      <div className="ml-auto flex items-center gap-2">
        {signedIn ? (
          <Suspense>
            <AccountMenu signedIn={signedIn} />
          </Suspense>
        ) : isSuccess || !isAsked ? (
          <Visitor />
        ) : null}
      </div>
    </header>
  );
};
