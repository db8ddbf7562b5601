import type { Blocker } from 'react-router-dom';
import { Ask } from '../../../components/ask.tsx';

export const LeaveGuard = ({ blocker }: { blocker: Blocker }) =>
  blocker.state === 'blocked' ? (
    <Ask
      isDangerous
      title="Leave without saving?"
      confirm="Leave and lose the changes"
      cancel="Stay here"
      onConfirm={() => blocker.proceed()}
      onCancel={() => blocker.reset()}
    >
      <p>What you changed since the last save is only on this page.</p>
    </Ask>
  ) : null;
