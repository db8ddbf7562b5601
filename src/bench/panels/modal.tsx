import { useEffect, useId, useRef, type ReactNode } from 'react';

interface Props {
  isOpen: boolean;
  title: string;
  /** an alert asks for a decision */ isAlert?: boolean;
  onClose: () => void;
  children: ReactNode;
}

/**
 * The browser's own modal dialog: it holds the focus, gives it back, closes by Escape and puts the rest
 * of the page out of reach. The bench needs no library for that, and its route no weight.
 */
export const Modal = ({ isOpen, title, isAlert = false, onClose, children }: Props) => {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const { current } = dialog;
    if (!isOpen || !current) return undefined;
    current.showModal();
    return () => current.close();
  }, [isOpen]);
  if (!isOpen) return null;
  return (
    <dialog
      ref={dialog}
      role={isAlert ? 'alertdialog' : undefined}
      aria-labelledby={id}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className="m-auto max-h-[90dvh] w-[460px] max-w-[calc(100vw-32px)] overflow-y-auto rounded-md border border-edge bg-sheet p-5 text-ink backdrop:bg-mat-deep backdrop:opacity-60"
    >
      <div className="grid gap-4">
        <h2 id={id} className="text-xl leading-tight font-bold">
          {title}
        </h2>
        {children}
      </div>
    </dialog>
  );
};
