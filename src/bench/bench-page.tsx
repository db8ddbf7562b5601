import { Navigate, useParams } from 'react-router-dom';
import { Failed } from '../components/failed.tsx';
import { Loading } from '../components/loading.tsx';
import { Page } from '../components/page.tsx';
import { useOpenBench } from '../simulation/use-open-bench.ts';
import { BenchRoom } from './panels/bench-room.tsx';

/** The bench of one attempt: goes on where the record stands. */
export const Component = () => {
  const { attempt = '' } = useParams();
  const { door, again } = useOpenBench(attempt);
  switch (door.kind) {
    case 'loading':
      return (
        <Page title="Bench" isNarrow>
          <Loading what="the oven onto the bench" rows={3} />
        </Page>
      );
    case 'failed':
      return (
        <Page title="Bench" isNarrow>
          <Failed
            what="This attempt"
            problem={door.problem}
            retry={() => again({ steal: false })}
          />
        </Page>
      );
    case 'broken':
      throw door.error;
    case 'closed':
      return <Navigate replace to={`/attempts/${door.attempt.id}`} />;
    case 'open':
      return <BenchRoom key={door.attempt.id} opened={door} again={again} />;
  }
};
