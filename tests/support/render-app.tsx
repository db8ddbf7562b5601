import { QueryClientProvider } from '@tanstack/react-query';
import { configure, render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, matchRoutes, RouterProvider } from 'react-router-dom';
import { vi } from 'vitest';
import { createQueryClient } from '../../src/api/query-client.ts';
import { routes } from '../../src/app/routes.tsx';

// Pages are whole and computers shared: what a person waits for may take a while, and still must come.
// `defaultHidden` spares a style lookup per element and query; jsdom knows none of our styles anyway.
configure({ asyncUtilTimeout: 5_000, defaultHidden: true });
vi.setConfig({ testTimeout: 30_000 });

/** jsdom lays nothing out, so there is nothing to scroll. */
window.scrollTo = () => undefined;

/** And so everything is in view at once. */
class AllInView {
  readonly #tell: IntersectionObserverCallback;

  constructor(tell: IntersectionObserverCallback) {
    this.#tell = tell;
  }

  observe(target: Element): void {
    const entry = { isIntersecting: true, target } as IntersectionObserverEntry;
    this.#tell([entry], this as unknown as IntersectionObserver);
  }

  disconnect(): void {}
}
Object.assign(window, { IntersectionObserver: AllInView });

/** The code of a lazy page is fetched before the clock of a test runs. */
const fetchCode = async (path: string): Promise<void> => {
  for (const { route } of matchRoutes(routes, path.split('?')[0] ?? path) ?? [])
    if (typeof route.lazy === 'function') await route.lazy();
};

/** The whole client at an address, as the browser would open it. Failed calls are not tried again. */
export const renderApp = async (path: string) => {
  await fetchCode(path);
  const queries = createQueryClient();
  queries.setDefaultOptions({ queries: { ...queries.getDefaultOptions().queries, retry: false } });
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  render(
    <QueryClientProvider client={queries}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return {
    user: userEvent.setup({ delay: null }),
    router,
    /** where the person is, or is on the way to while that page's code is fetched */
    address: () => {
      const { location, navigation } = router.state;
      const { pathname, search } = navigation.location ?? location;
      return `${pathname}${search}`;
    },
  };
};
