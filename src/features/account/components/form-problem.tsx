import type { Problem } from '../../../api/problem.ts';
import { Notice } from '../../../components/notice.tsx';

/** What stood against sending a form, above its button. Plain: a refused form is no danger. */
export const FormProblem = ({ problem }: { problem: Problem | null }) =>
  problem ? (
    <div role="alert">
      <Notice kind="plain" title={problem.message} />
    </div>
  ) : null;
