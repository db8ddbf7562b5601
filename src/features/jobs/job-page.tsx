import { Link, useParams } from 'react-router-dom';
import type { Job } from '../../../shared/contracts/scenarios.ts';
import { CautionPanel } from '../../components/caution-panel.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { useJob } from './api/use-job.ts';
import { OwnAttempts } from './components/own-attempts.tsx';
import { Ticket } from './components/ticket.tsx';
import { ToTheBench } from './components/to-the-bench.tsx';
import { conditionText } from './condition-text.ts';
import { levelName } from './level-name.ts';

const Conditions = ({ job }: { job: Job }) => (
  <section aria-labelledby="conditions" className="grid gap-3">
    <h2 id="conditions" className="text-xl font-bold">
      Conditions
    </h2>
    <dl className="grid grid-cols-[92px_1fr] gap-x-4 gap-y-2">
      <dt className="text-ink-2">Condition</dt>
      <dd>
        <span className="font-semibold">{job.condition}</span>. {conditionText(job.condition)}
      </dd>
      <dt className="text-ink-2">Level</dt>
      <dd>{levelName(job.level)}</dd>
      <dt className="text-ink-2">Symptom</dt>
      <dd>{job.symptom}</dd>
      <dt className="text-ink-2">Best so far</dt>
      <dd>{job.best === null ? 'not handed in yet' : `${Math.round(job.best)} of 100`}</dd>
    </dl>
  </section>
);

const Cover = ({ job }: { job: Job }) => (
  <div className="grid items-start gap-8 md:grid-cols-[340px_1fr]">
    <div className="grid gap-5">
      <Ticket job={job} />
      <ToTheBench scenario={job.scenario} />
    </div>
    <div className="grid gap-8">
      <Conditions job={job} />
      <OwnAttempts scenario={job.scenario} />
      <CautionPanel />
    </div>
  </div>
);

export const Component = () => {
  const { scenario = '' } = useParams();
  const query = useJob(scenario);
  return (
    <Page
      title={query.data?.title ?? 'Job'}
      lead={
        query.data ? (
          <span className="text-base">
            Job <span className="font-mono">{String(query.data.number).padStart(4, '0')}</span>,
            version {query.data.version}.{' '}
            <Link to="/jobs" className="font-semibold text-act underline underline-offset-2">
              All jobs
            </Link>
          </span>
        ) : null
      }
    >
      {query.isPending ? (
        <Loading what="the job ticket" />
      ) : query.isError ? (
        <Failed what="The job ticket" problem={query.error} retry={() => void query.refetch()} />
      ) : (
        <Cover job={query.data} />
      )}
    </Page>
  );
};
