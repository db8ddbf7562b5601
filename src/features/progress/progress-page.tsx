import { useQueries } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { AttemptSummary } from '../../../shared/contracts/attempts.ts';
import { ButtonLink } from '../../components/button-link.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { DataTable } from '../../components/table/data-table.tsx';
import { useSortInUrl } from '../../components/table/use-sort-in-url.ts';
import { debriefQuery } from '../debrief/api/debrief-query.ts';
import { useOwnAttempts } from '../jobs/api/use-own-attempts.ts';
import { progressColumns } from './progress-columns.tsx';

const ProgressTable = ({ attempts }: { attempts: readonly AttemptSummary[] }) => {
  const [sort, setSort] = useSortInUrl('-handed-in');
  const { debriefs, missing } = useQueries({
    queries: attempts.map(({ id }) => debriefQuery(id)),
    combine: (results) => ({
      debriefs: results.map(({ data }) => data ?? null),
      missing: results.filter(({ isError }) => isError).length,
    }),
  });
  const rows = useMemo(
    () => attempts.map((attempt, index) => ({ attempt, debrief: debriefs[index] ?? null })),
    [attempts, debriefs],
  );
  return (
    <div className="grid gap-3">
      <p className="text-sm text-ink-2">
        Each skill from 0 to 100. A dash: the attempt gave nothing to judge it by.
        {missing > 0
          ? ` The skills of ${missing} attempts could not be loaded; reload to try again.`
          : ''}
      </p>
      <DataTable
        caption="Your attempts by skill"
        columns={progressColumns}
        rows={rows}
        rowId={({ attempt }) => attempt.id}
        sort={sort}
        onSort={setSort}
      />
    </div>
  );
};

export const Component = () => {
  const query = useOwnAttempts();
  const handedIn = useMemo(
    () => query.data?.filter(({ status }) => status === 'handed in') ?? [],
    [query.data],
  );
  return (
    <Page title="Progress" lead="What you handed in, by skill.">
      {query.isPending ? (
        <Loading what="your attempts" />
      ) : query.isError ? (
        <Failed what="Your attempts" problem={query.error} retry={() => void query.refetch()} />
      ) : handedIn.length === 0 ? (
        <EmptyState
          title="You have not handed in a job sheet yet."
          action={<ButtonLink to="/jobs">Pick a job</ButtonLink>}
        >
          Every attempt you hand in is marked in six skills and then stands here.
        </EmptyState>
      ) : (
        <ProgressTable attempts={handedIn} />
      )}
    </Page>
  );
};
