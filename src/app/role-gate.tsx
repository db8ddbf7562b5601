import { useState } from 'react';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import type { Role } from '../../shared/contracts/fields.ts';
import { ButtonLink } from '../components/button-link.tsx';
import { EmptyState } from '../components/empty-state.tsx';
import { Failed } from '../components/failed.tsx';
import { Loading } from '../components/loading.tsx';
import { Page } from '../components/page.tsx';
import { useSignedIn } from '../features/account/api/use-signed-in.ts';
import { homeOf } from './navigation.ts';

/** Lets the pages below it stand only for people of these roles. The server decides again for every call. */
export const RoleGate = ({ roles }: { roles: readonly Role[] }) => {
  const { pathname, search } = useLocation();
  const query = useSignedIn();
  const [hasStood, setHasStood] = useState(false);
  if (query.data && !hasStood) setHasStood(true);
  if (query.isPending)
    return (
      <Page title="Coldbench">
        <Loading what="your account" />
      </Page>
    );
  if (query.isError)
    return (
      <Page title="Coldbench">
        <Failed what="Your account" problem={query.error} retry={() => void query.refetch()} />
      </Page>
    );
  if (query.data === null) {
    // Whoever was let in and is nobody now has signed out: the next person starts afresh.
    const signIn = `/sign-in?then=${encodeURIComponent(pathname + search)}`;
    return <Navigate replace to={hasStood ? '/' : signIn} />;
  }
  if (roles.includes(query.data.role)) return <Outlet />;
  return (
    <Page title="Not for your role">
      <EmptyState
        title={`This page is for another role than ${query.data.role}.`}
        action={<ButtonLink to={homeOf(query.data.role)}>Go to your own start page</ButtonLink>}
      >
        You work in {query.data.organisation.name} as {query.data.role}. Switch the organisation in
        the account menu, or ask an administrator of it for the role you need.
      </EmptyState>
    </Page>
  );
};
