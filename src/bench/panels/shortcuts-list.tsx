import { Button } from '../../components/button.tsx';
import { Modal } from './modal.tsx';
import { shortcuts } from './use-shortcuts.ts';

export const ShortcutsList = ({ isOpen, onClose }: { isOpen: boolean; onClose: () => void }) => (
  <Modal isOpen={isOpen} title="Keys on the bench" onClose={onClose}>
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
  </Modal>
);
