import { configure, render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import type { ReactNode } from 'react';
import { vi } from 'vitest';
import { BenchContext } from '../../src/simulation/bench-context.ts';
import type { BenchOnPage } from './bench-on-page.ts';

configure({ asyncUtilTimeout: 5_000, defaultHidden: true });
vi.setConfig({ testTimeout: 30_000 });

/** Something of the bench page on its own, with a bench under it. */
export function renderOnBench({ bench }: BenchOnPage, ui: ReactNode) {
  const user = userEvent.setup({ delay: null });
  const page = render(<BenchContext value={bench}>{ui}</BenchContext>);
  return { user, page };
}
