import { QueryClient } from '@tanstack/react-query';
import { Problem } from './problem.ts';

declare module '@tanstack/react-query' {
  interface Register {
    defaultError: Problem;
  }
}

/** Asking again helps only when nobody answered or the server stumbled; a refusal stays one. */
const mayPass = (problem: unknown): boolean =>
  problem instanceof Problem && (problem.status === 0 || problem.status >= 500);

export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        retry: (failures, problem) => failures < 2 && mayPass(problem),
        retryDelay: (failures) => 500 * 2 ** failures,
      },
      mutations: { retry: false },
    },
  });
