import { useNavigate } from 'react-router-dom';
import { Button } from '../../../components/button.tsx';
import { ButtonLink } from '../../../components/button-link.tsx';
import { Notice } from '../../../components/notice.tsx';
import { useOwnAttempts } from '../api/use-own-attempts.ts';
import { useStartAttempt } from '../api/use-start-attempt.ts';

/** Starts an attempt, or goes on with the one that still stands on the bench. */
export const ToTheBench = ({ scenario }: { scenario: string }) => {
  const attempts = useOwnAttempts(scenario);
  const start = useStartAttempt();
  const navigate = useNavigate();
  const open = attempts.data?.find(({ status }) => status === 'on the bench');
  const begin = (): void =>
    start.mutate({ scenario }, { onSuccess: ({ id }) => void navigate(`/bench/${id}`) });
  return (
    <div className="grid justify-items-start gap-3">
      {open ? (
        <ButtonLink to={`/bench/${open.id}`} look="main">
          Go on with your attempt
        </ButtonLink>
      ) : (
        <Button
          look="main"
          busy={
            start.isPending ? 'Putting it on the bench' : attempts.isPending && 'Start on the bench'
          }
          onClick={begin}
        >
          Start on the bench
        </Button>
      )}
      {start.isError ? (
        <Notice kind="plain" title="The attempt could not be started." isNews>
          <p>{start.error.message}</p>
        </Notice>
      ) : null}
    </div>
  );
};
