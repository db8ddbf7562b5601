import { AlertDialog } from '@base-ui/react/alert-dialog';
import type { ReactNode } from 'react';
import { Button } from './button.tsx';

interface Props {
  isOpen: boolean;
  title: string;
  /** what will happen */ children: ReactNode;
  /** what the button does: "Make Tom Reyes an instructor" */ confirm: string;
  /** what keeps things as they are */ cancel: string;
  busy?: string | false;
  isDangerous?: boolean;
  onConfirm: () => void;
  onCancel: () => void;
}

/** Asks before something that is not easily undone. */
export const ConfirmDialog = (props: Props) => {
  const { isOpen, title, children, confirm, cancel, busy, isDangerous, onConfirm, onCancel } =
    props;
  return (
    <AlertDialog.Root open={isOpen} onOpenChange={(open) => (open ? undefined : onCancel())}>
      <AlertDialog.Portal>
        <AlertDialog.Backdrop className="fixed inset-0 z-20 bg-mat-deep opacity-60" />
        <AlertDialog.Popup className="fixed top-1/2 left-1/2 z-20 grid max-h-[90dvh] w-[460px] max-w-[calc(100vw-32px)] -translate-x-1/2 -translate-y-1/2 gap-4 overflow-y-auto rounded-md border border-edge bg-sheet p-5 text-ink">
          <AlertDialog.Title className="text-xl leading-tight font-bold">{title}</AlertDialog.Title>
          <AlertDialog.Description render={<div className="grid gap-3" />}>
            {children}
          </AlertDialog.Description>
          <div className="flex flex-wrap justify-end gap-3">
            <Button onClick={onCancel}>{cancel}</Button>
            <Button look={isDangerous ? 'danger' : 'main'} busy={busy ?? false} onClick={onConfirm}>
              {confirm}
            </Button>
          </div>
        </AlertDialog.Popup>
      </AlertDialog.Portal>
    </AlertDialog.Root>
  );
};
