import { lazy, Suspense, type ComponentProps } from 'react';
import type { ConfirmDialog as Dialog } from './confirm-dialog.tsx';

const ConfirmDialog = lazy(async () => {
  const { ConfirmDialog: loaded } = await import('./confirm-dialog.tsx');
  return { default: loaded };
});

type Props = Omit<ComponentProps<typeof Dialog>, 'isOpen'>;

/** A question that stands as long as this is rendered; the code of dialogs is fetched for the first one. */
export const Ask = (props: Props) => (
  <Suspense>
    <ConfirmDialog {...props} isOpen />
  </Suspense>
);
