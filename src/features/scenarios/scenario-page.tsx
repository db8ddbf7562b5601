import { useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { EmptyState } from '../../components/empty-state.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { useOvens } from '../ovens/api/use-ovens.ts';
import { useScenario } from './api/use-scenario.ts';
import { Editor } from './components/editor.tsx';
import type { OvenChoice } from './components/job-fields.tsx';
import { newDraft } from './new-draft.ts';

interface Props {
  id: string;
  ovens: readonly OvenChoice[];
  editorKey: string;
  onCreated: (id: string) => void;
}

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
  if (isNew)
    return (
      <Editor
        key={editorKey}
        scenario={null}
        start={newDraft(first.id)}
        ovens={ovens}
        onCreated={onCreated}
      />
    );
  if (query.isPending) return <Loading what="the scenario" />;
  if (query.isError)
    return <Failed what="The scenario" problem={query.error} retry={() => void query.refetch()} />;
  return (
    <Editor
      key={editorKey}
      scenario={query.data}
      start={query.data.draft}
      ovens={ovens}
      onCreated={onCreated}
    />
  );
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
