import type { Blocker } from 'react-router-dom';
import { ConfirmDialog } from '../../../components/confirm-dialog.tsx';

export const LeaveGuard = ({ blocker }: { blocker: Blocker }) =>
  blocker.state === 'blocked' ? (
    <ConfirmDialog
      isOpen
      isDangerous
      title="Leave without saving?"
      confirm="Leave and lose the changes"
      cancel="Stay here"
      onConfirm={() => blocker.proceed()}
      onCancel={() => blocker.reset()}
    >
      <p>What you changed since the last save is only on this page.</p>
    </ConfirmDialog>
  ) : null;
