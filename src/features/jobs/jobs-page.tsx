import type { Job } from '../../../shared/contracts/scenarios.ts';
import { Button } from '../../components/button.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { DataTable } from '../../components/table/data-table.tsx';
import { useSortInUrl } from '../../components/table/use-sort-in-url.ts';
import { useJobs } from './api/use-jobs.ts';
import { JobFilters } from './components/job-filters.tsx';
import { useJobFilters } from './hooks/use-job-filters.ts';
import { jobColumns } from './job-columns.tsx';

const JobList = ({ jobs }: { jobs: readonly Job[] }) => {
  const filters = useJobFilters();
  const [sort, setSort] = useSortInUrl('level');
  const matching = jobs.filter(filters.matches);
  return (
    <div className="grid gap-4">
      <JobFilters values={filters.values} set={filters.set} />
      <p role="status" className="text-sm text-ink-2">
        {matching.length} of {jobs.length} jobs
      </p>
      {matching.length === 0 ? (
        <EmptyState
          title="No job matches."
          action={<Button onClick={filters.clear}>Show all jobs</Button>}
        >
          Take a filter away, or search for another word.
        </EmptyState>
      ) : (
        <DataTable
          caption="Jobs"
          columns={jobColumns}
          rows={matching}
          rowId={({ scenario }) => scenario}
          sort={sort}
          onSort={setSort}
        />
      )}
    </div>
  );
};

export const Component = () => {
  const query = useJobs();
  return (
    <Page title="Jobs" lead="Pick a job, read its ticket, then take it to the bench.">
      {query.isPending ? (
        <Loading what="the jobs" />
      ) : query.isError ? (
        <Failed what="The jobs" problem={query.error} retry={() => void query.refetch()} />
      ) : query.data.length === 0 ? (
        <EmptyState title="There are no jobs yet.">
          An instructor publishes them. Ask yours, or come back later.
        </EmptyState>
      ) : (
        <JobList jobs={query.data} />
      )}
    </Page>
  );
};
