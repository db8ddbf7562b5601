import { Dialog } from '@base-ui/react/dialog';
import { Button } from '../../components/button.tsx';
import { shortcuts } from './use-shortcuts.ts';

export const ShortcutsList = ({ isOpen, onClose }: { isOpen: boolean; onClose: () => void }) => (
  <Dialog.Root open={isOpen} onOpenChange={(open) => (open ? undefined : onClose())}>
    <Dialog.Portal>
      <Dialog.Backdrop className="fixed inset-0 z-20 bg-mat-deep opacity-60" />
      <Dialog.Popup className="fixed top-1/2 left-1/2 z-20 grid max-h-[90dvh] w-[460px] max-w-[calc(100vw-32px)] -translate-x-1/2 -translate-y-1/2 gap-4 overflow-y-auto rounded-md border border-edge bg-sheet p-5 text-ink">
        <Dialog.Title className="text-xl font-bold">Keys on the bench</Dialog.Title>
        <dl className="grid grid-cols-[72px_1fr] items-baseline gap-x-3 gap-y-2">
          {shortcuts.map(({ key, name }) => (
            <div key={key} className="col-span-2 grid grid-cols-subgrid items-baseline">
              <dt>
                <kbd className="rounded border border-edge px-1.5 font-mono text-sm">{key}</kbd>
              </dt>
              <dd>{name}</dd>
            </div>
          ))}
        </dl>
        <p className="text-sm text-ink-2">
          They work while the focus is on the mat, the meter or the tools.
        </p>
        <div className="flex justify-end">
          <Button onClick={onClose}>Close</Button>
        </div>
      </Dialog.Popup>
    </Dialog.Portal>
  </Dialog.Root>
);
