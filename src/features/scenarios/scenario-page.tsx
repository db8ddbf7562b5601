import { useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import type { Scenario } from '../../../shared/contracts/scenarios.ts';
import type { ScenarioContent } from '../../../shared/scenario/scenario.ts';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { useOven } from '../ovens/api/use-oven.ts';
import { useOvens } from '../ovens/api/use-ovens.ts';
import { useScenario } from './api/use-scenario.ts';
import { Editor } from './components/editor.tsx';
import type { OvenChoice } from './components/job-fields.tsx';
import { newDraft } from './new-draft.ts';
import { withUsualValues } from './usual-values.ts';

interface Props {
  id: string;
  ovens: readonly OvenChoice[];
  editorKey: string;
  onCreated: (id: string) => void;
}

type OpenedProps = Pick<Props, 'ovens' | 'onCreated'> & {
  scenario: Scenario | null;
  draft: ScenarioContent;
};

/** Opens the draft once; what is saved later never changes the form. Without its oven it stands as it is. */
const Opened = ({ draft, ...rest }: OpenedProps) => {
  const [opened] = useState(draft);
  const oven = useOven(opened.oven);
  if (oven.isPending) return <Loading what="the oven" />;
  const start = oven.data ? withUsualValues(opened, oven.data.definition) : opened;
  return <Editor start={start} {...rest} />;
};

const Loaded = ({ id, ovens, editorKey, onCreated }: Props) => {
  const isNew = id === 'new';
  const query = useScenario(isNew ? null : id);
  const [first] = ovens;
  if (!first)
    return (
      <EmptyState title="There is no oven to put a fault in.">
        Ovens come with the server. Ask whoever runs it.
      </EmptyState>
    );
  const rest = { ovens, onCreated };
  if (isNew) return <Opened key={editorKey} scenario={null} draft={newDraft(first.id)} {...rest} />;
  if (query.isPending) return <Loading what="the scenario" />;
  if (query.isError)
    return <Failed what="The scenario" problem={query.error} retry={() => void query.refetch()} />;
  return <Opened key={editorKey} scenario={query.data} draft={query.data.draft} {...rest} />;
};

/** The editor at `/scenarios/new` and `/scenarios/:id`: one page, so that a first save keeps the form as it is. */
export const Component = () => {
  const { scenario: id = 'new' } = useParams();
  const navigate = useNavigate();
  const [created, setCreated] = useState<string | null>(null);
  const ovens = useOvens();
  const onCreated = (made: string): void => {
    setCreated(made);
    void navigate(`/scenarios/${made}`, { replace: true });
  };
  return (
    <Page
      title={id === 'new' ? 'New scenario' : 'Scenario'}
      lead={
        <Link
          to="/scenarios"
          className="text-base font-semibold text-act underline underline-offset-2"
        >
          All scenarios
        </Link>
      }
      isNarrow
    >
      {ovens.isPending ? (
        <Loading what="the ovens" />
      ) : ovens.isError ? (
        <Failed what="The ovens" problem={ovens.error} retry={() => void ovens.refetch()} />
      ) : (
        <Loaded
          id={id}
          ovens={ovens.data}
          editorKey={id === created ? 'new' : id}
          onCreated={onCreated}
        />
      )}
    </Page>
  );
};
