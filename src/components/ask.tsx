import { lazy, Suspense, useEffect, type ComponentProps } from 'react';
import type { ConfirmDialog as Dialog } from './confirm-dialog.tsx';

const ConfirmDialog = lazy(async () => {
  const { ConfirmDialog: loaded } = await import('./confirm-dialog.tsx');
  return { default: loaded };
});

type Props = Omit<ComponentProps<typeof Dialog>, 'isOpen'>;

/** The question is taken away whole, with no closing of its own that would give the focus back. */
const useFocusBack = (): void => {
  useEffect(() => {
    const before = document.activeElement;
    return () => {
      setTimeout(() => {
        const isLost = document.activeElement === null || document.activeElement === document.body;
        if (isLost && before instanceof HTMLElement) before.focus();
      });
    };
  }, []);
};

/** A question that stands as long as this is rendered; the code of dialogs is fetched for the first one. */
export const Ask = (props: Props) => {
  useFocusBack();
  return (
    <Suspense>
      <ConfirmDialog {...props} isOpen />
    </Suspense>
  );
};
