import type { AttemptSummary } from '../../../shared/contracts/attempts.ts';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { DataTable } from '../../components/table/data-table.tsx';
import { useSortInUrl } from '../../components/table/use-sort-in-url.ts';
import { useAttemptsForReview } from './api/use-attempts-for-review.ts';
import { reviewColumns } from './review-columns.tsx';

const ReviewTable = ({ attempts }: { attempts: readonly AttemptSummary[] }) => {
  const [sort, setSort] = useSortInUrl('-started');
  return (
    <DataTable
      caption="Attempts of this organisation"
      columns={reviewColumns}
      rows={attempts}
      rowId={({ id }) => id}
      sort={sort}
      onSort={setSort}
    />
  );
};

export const Component = () => {
  const query = useAttemptsForReview();
  return (
    <Page title="Review" lead="The attempts of your organisation. Open one to read its debrief.">
      {query.isPending ? (
        <Loading what="the attempts" />
      ) : query.isError ? (
        <Failed what="The attempts" problem={query.error} retry={() => void query.refetch()} />
      ) : query.data.length === 0 ? (
        <EmptyState title="Nobody has started an attempt yet.">
          Publish a scenario, and it stands in the job list of every trainee.
        </EmptyState>
      ) : (
        <ReviewTable attempts={query.data} />
      )}
    </Page>
  );
};
