import type { ScenarioSummary } from '../../../shared/contracts/scenarios.ts';
import { ButtonLink } from '../../components/button-link.tsx';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { DataTable } from '../../components/table/data-table.tsx';
import { useSortInUrl } from '../../components/table/use-sort-in-url.ts';
import { useScenarios } from './api/use-scenarios.ts';
import { scenarioColumns } from './scenario-columns.tsx';

const ScenarioTable = ({ scenarios }: { scenarios: readonly ScenarioSummary[] }) => {
  const [sort, setSort] = useSortInUrl('-updated');
  return (
    <DataTable
      caption="Scenarios of this organisation"
      columns={scenarioColumns}
      rows={scenarios}
      rowId={({ id }) => id}
      sort={sort}
      onSort={setSort}
    />
  );
};

export const Component = () => {
  const query = useScenarios();
  return (
    <Page
      title="Scenarios"
      lead="An oven, its faults and a ticket. What you publish stands in the job list."
      actions={
        <ButtonLink to="/scenarios/new" look="main">
          Write a scenario
        </ButtonLink>
      }
    >
      {query.isPending ? (
        <Loading what="the scenarios" />
      ) : query.isError ? (
        <Failed what="The scenarios" problem={query.error} retry={() => void query.refetch()} />
      ) : query.data.length === 0 ? (
        <EmptyState title="There are no scenarios yet.">
          Write the first: pick an oven, put a fault in it and write what the customer says.
        </EmptyState>
      ) : (
        <ScenarioTable scenarios={query.data} />
      )}
    </Page>
  );
};
