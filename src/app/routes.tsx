import type { RouteObject } from 'react-router-dom';
import { ErrorPage } from './error-page.tsx';
import { FirstLoad } from './first-load.tsx';
import { NotFoundPage } from './not-found-page.tsx';
import { RoleGate } from './role-gate.tsx';
import { Shell } from './shell.tsx';

const anyone: RouteObject[] = [
  { index: true, lazy: () => import('../features/visit/home-page.tsx') },
  { path: 'try', lazy: () => import('../features/visit/try-page.tsx') },
  { path: 'sign-in', lazy: () => import('../features/account/sign-in-page.tsx') },
  { path: 'sign-up', lazy: () => import('../features/account/sign-up-page.tsx') },
  // A visitor has an attempt too, so its debrief asks for no account.
  { path: 'attempts/:attempt', lazy: () => import('../features/debrief/attempt-page.tsx') },
];

const everyRole: RouteObject[] = [
  { path: 'jobs', lazy: () => import('../features/jobs/jobs-page.tsx') },
  { path: 'jobs/:scenario', lazy: () => import('../features/jobs/job-page.tsx') },
  { path: 'progress', lazy: () => import('../features/progress/progress-page.tsx') },
  { path: 'account', lazy: () => import('../features/account/account-page.tsx') },
];

const instructor: RouteObject[] = [
  { path: 'scenarios', lazy: () => import('../features/scenarios/scenarios-page.tsx') },
  { path: 'scenarios/:scenario', lazy: () => import('../features/scenarios/scenario-page.tsx') },
];

const reviewer: RouteObject[] = [
  { path: 'review', lazy: () => import('../features/review/review-page.tsx') },
];

const administrator: RouteObject[] = [
  { path: 'people', lazy: () => import('../features/people/people-page.tsx') },
];

export const routes: RouteObject[] = [
  // The bench fills the window and has a header of its own.
  {
    path: 'bench/:attempt',
    ErrorBoundary: ErrorPage,
    HydrateFallback: FirstLoad,
    lazy: () => import('../bench/bench-page.tsx'),
  },
  {
    element: <Shell />,
    ErrorBoundary: ErrorPage,
    HydrateFallback: FirstLoad,
    children: [
      ...anyone,
      {
        element: <RoleGate roles={['trainee', 'instructor', 'administrator']} />,
        children: everyRole,
      },
      { element: <RoleGate roles={['instructor']} />, children: instructor },
      { element: <RoleGate roles={['instructor', 'administrator']} />, children: reviewer },
      { element: <RoleGate roles={['administrator']} />, children: administrator },
      { path: '*', element: <NotFoundPage /> },
    ],
  },
];
