import { screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { ProbeLine } from '../../../src/bench/meter/probe-line.tsx';
import { HoldChoice } from '../../../src/bench/panels/hold-choice.tsx';
import { openBenchOnPage } from '../../support/bench-on-page.ts';
import { renderOnBench } from '../../support/render-on-bench.tsx';

describe('how a probe is held', () => {
  it('is chosen on the dock, goes on record, and is said beside what the tip is on', async () => {
    const page = openBenchOnPage();
    const { user } = renderOnBench(
      page,
      <>
        <HoldChoice probe="red" />
        <ProbeLine probe="red" />
      </>,
    );
    const choice = screen.getByRole('combobox', { name: 'How the red probe is held' });
    expect(choice).toHaveValue('handle');
    await user.selectOptions(choice, 'clip');
    expect(choice).toHaveValue('clip');
    expect(page.added).toEqual([
      [expect.objectContaining({ type: 'ProbeHeld', data: { probe: 'red', hold: 'clip' } })],
    ]);
    expect(screen.getByText(/nothing, through a clip lead/)).toBeInTheDocument();
    page.bench.getState().tap('C1.1');
    await user.selectOptions(choice, 'fingers');
    expect(page.bench.getState().state.holds).toEqual({ red: 'fingers', black: 'handle' });
  });
});
