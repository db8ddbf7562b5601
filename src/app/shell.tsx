import { Outlet, ScrollRestoration, useNavigation } from 'react-router-dom';
import { Header } from './header.tsx';
import { SkipLink } from './skip-link.tsx';

/** Everything but the bench stands in this: header above, the page below. */
export const Shell = () => {
  const isOnTheWay = useNavigation().state === 'loading';
  return (
    <div className="flex min-h-dvh flex-col">
      <SkipLink />
      <Header />
      <main id="main" tabIndex={-1} aria-busy={isOnTheWay} className="grow outline-none">
        <Outlet />
      </main>
      <ScrollRestoration />
    </div>
  );
};
