import { ButtonLink } from '../components/button-link.tsx';
import { EmptyState } from '../components/empty-state.tsx';
import { Page } from '../components/page.tsx';

export const NotFoundPage = () => (
  <Page title="No such page">
    <EmptyState
      title="Nothing is at this address."
      action={<ButtonLink to="/">Go to the start page</ButtonLink>}
    >
      It may have been mistyped, or what was here is gone. Check the address, or begin from the
      start page.
    </EmptyState>
  </Page>
);
