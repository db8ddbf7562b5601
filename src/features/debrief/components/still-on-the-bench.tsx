import type { Attempt } from '../../../../shared/contracts/attempts.ts';
import { ButtonLink } from '../../../components/button-link.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';

export const StillOnTheBench = ({ attempt }: { attempt: Attempt }) =>
  attempt.isOwn ? (
    <EmptyState
      title="This attempt is still on the bench."
      action={
        <ButtonLink to={`/bench/${attempt.id}`} look="main">
          Go on with your attempt
        </ButtonLink>
      }
    >
      The debrief comes when you hand in the job sheet.
    </EmptyState>
  ) : (
    <EmptyState title="This attempt is still on the bench.">
      {attempt.person?.name ?? 'A visitor'} has not handed in the job sheet. The debrief comes then.
    </EmptyState>
  );
