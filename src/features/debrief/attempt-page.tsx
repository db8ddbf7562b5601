import { Link, useParams } from 'react-router-dom';
import type { Attempt } from '../../../shared/contracts/attempts.ts';
import { benchClock } from '../../components/bench-clock.ts';
import { CautionPanel } from '../../components/caution-panel.tsx';
import { DateText } from '../../components/date-text.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { useAttempt } from './api/use-attempt.ts';
import { DebriefView } from './components/debrief-view.tsx';
import { KeepAttempt } from './components/keep-attempt.tsx';
import { StillOnTheBench } from './components/still-on-the-bench.tsx';

const link = 'font-semibold text-act underline underline-offset-2';

const nameOf = ({ status }: Attempt): string => (status === 'handed in' ? 'Debrief' : 'Attempt');

const Back = ({ attempt: { scenario, isTrial } }: { attempt: Attempt }) => {
  if (scenario === null) return null;
  return isTrial ? (
    <Link className={link} to={`/scenarios/${scenario}`}>
      Back to the scenario
    </Link>
  ) : (
    <Link className={link} to={`/jobs/${scenario}`}>
      The job and its other attempts
    </Link>
  );
};

const Lead = ({ attempt }: { attempt: Attempt }) => (
  <span className="flex flex-wrap gap-x-4 gap-y-1 text-base">
    <span>
      {attempt.person?.name ?? 'A visitor'}, <DateText at={attempt.startedAt} />
    </span>
    <span>
      <span className="font-mono">{benchClock(attempt.benchMs)}</span> bench time
    </span>
    <Back attempt={attempt} />
  </span>
);

export const Component = () => {
  const { attempt: id = '' } = useParams();
  const query = useAttempt(id);
  return (
    <Page
      title={query.data ? `${nameOf(query.data)}: ${query.data.title}` : 'Attempt'}
      lead={query.data ? <Lead attempt={query.data} /> : null}
    >
      {query.isPending ? (
        <Loading what="the attempt" />
      ) : query.isError ? (
        <Failed what="The attempt" problem={query.error} retry={() => void query.refetch()} />
      ) : query.data.status === 'handed in' ? (
        <DebriefView attempt={query.data} />
      ) : (
        <StillOnTheBench attempt={query.data} />
      )}
      <KeepAttempt />
      <CautionPanel />
    </Page>
  );
};
