import { Link, useLocation } from 'react-router-dom';
import type { Problem } from '../api/problem.ts';
import { Button } from './button.tsx';
import { Notice } from './notice.tsx';

interface Props {
  /** "The jobs" */ what: string;
  problem: Problem;
  retry: () => void;
}

/** In place of what could not be loaded: what happened, and what to do. */
export const Failed = ({ what, problem, retry }: Props) => {
  const { pathname, search } = useLocation();
  return (
    <Notice kind="plain" title={`${what} could not be loaded.`} isNews>
      <p>{problem.message}</p>
      <div className="flex flex-wrap items-center gap-4">
        <Button isSmall onClick={retry}>
          Try again
        </Button>
        {problem.code === 'not-signed-in' ? (
          <Link
            className="font-semibold text-act underline underline-offset-2"
            to={`/sign-in?then=${encodeURIComponent(pathname + search)}`}
          >
            Sign in
          </Link>
        ) : null}
      </div>
    </Notice>
  );
};
