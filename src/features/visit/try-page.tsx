import { useEffect } from 'react';
import { useNavigate } from 'react-router-dom';
import { CautionPanel } from '../../components/caution-panel.tsx';
import { Failed } from '../../components/failed.tsx';
import { Loading } from '../../components/loading.tsx';
import { Page } from '../../components/page.tsx';
import { useStartVisit } from './api/use-start-visit.ts';

/** Puts the practice job on the bench and goes there; a visitor who was at it goes on where they stood. */
export const Component = () => {
  const { mutate, error } = useStartVisit();
  const navigate = useNavigate();
  useEffect(() => {
    mutate(undefined, {
      onSuccess: ({ attempt }) => void navigate(`/bench/${attempt.id}`, { replace: true }),
    });
  }, [mutate, navigate]);
  const retry = (): void =>
    mutate(undefined, {
      onSuccess: ({ attempt }) => void navigate(`/bench/${attempt.id}`, { replace: true }),
    });
  return (
    <Page title="Practice job" isNarrow>
      {error ? (
        <Failed what="The practice job" problem={error} retry={retry} />
      ) : (
        <Loading what="the practice job onto the bench" rows={2} />
      )}
      <CautionPanel />
    </Page>
  );
};
