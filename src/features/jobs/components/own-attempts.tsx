import { Link } from 'react-router-dom';
import type { AttemptSummary } from '../../../../shared/contracts/attempts.ts';
import { DateText } from '../../../components/date-text.tsx';
import { Failed } from '../../../components/failed.tsx';
import { Loading } from '../../../components/loading.tsx';
import { useOwnAttempts } from '../api/use-own-attempts.ts';

const Line = ({ attempt }: { attempt: AttemptSummary }) => {
  const isOpen = attempt.status === 'on the bench';
  return (
    <li className="grid gap-x-4 gap-y-1 px-4 py-3 sm:grid-cols-[1fr_auto]">
      <span className="grid gap-0.5">
        <Link
          to={isOpen ? `/bench/${attempt.id}` : `/attempts/${attempt.id}`}
          className="font-semibold text-act underline underline-offset-2"
        >
          {isOpen ? 'Still on the bench, go on' : 'Handed in, read the debrief'}
        </Link>
        <span className="text-sm text-ink-2">
          Started <DateText at={attempt.startedAt} />, version {attempt.version}
        </span>
        {attempt.outcome ? <span className="text-sm">{attempt.outcome}</span> : null}
      </span>
      {attempt.score === null ? null : (
        <span className="font-mono font-semibold">
          {Math.round(attempt.score)} <span className="text-sm font-normal">of 100</span>
        </span>
      )}
    </li>
  );
};

export const OwnAttempts = ({ scenario }: { scenario: string }) => {
  const query = useOwnAttempts(scenario);
  return (
    <section aria-labelledby="own-attempts" className="grid gap-3">
      <h2 id="own-attempts" className="text-xl font-bold">
        Your attempts
      </h2>
      {query.isPending ? (
        <Loading what="your attempts" rows={2} />
      ) : query.isError ? (
        <Failed what="Your attempts" problem={query.error} retry={() => void query.refetch()} />
      ) : query.data.length === 0 ? (
        <p className="text-ink-2">
          None yet. Each attempt draws its own oven, so it is never the same twice.
        </p>
      ) : (
        <ul className="grid divide-y divide-line rounded-md border border-line bg-sheet">
          {query.data.map((attempt) => (
            <Line key={attempt.id} attempt={attempt} />
          ))}
        </ul>
      )}
    </section>
  );
};
