import { QueryClientProvider } from '@tanstack/react-query';
import { act, fireEvent, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { getOven } from '../../../shared/contracts/ovens.ts';
import { createQueryClient } from '../../../src/api/query-client.ts';
import { ReplayPanel } from '../../../src/bench/replay/replay-panel.tsx';
import { recorded } from '../../support/bench.ts';
import { attempt, layout, oven } from '../../support/client-fixtures.ts';
import { fakeApi } from '../../support/fake-api.ts';

const reading = {
  red: 'T1.HV',
  black: 'T1.core',
  setting: 'ohms-200',
  display: '94.8',
  unit: 'Ω',
  value: 94.8,
  isSettled: true,
  isBeeping: false,
  isRelative: false,
};
const step = (type: string, benchMs: number, data: Record<string, unknown> = {}) => ({
  type,
  version: 1 as const,
  benchMs,
  data,
});
const events = recorded([
  step('AttemptBegan', 0, { engine: 1, seed: 417, charge: {}, opened: [], isDisplayLit: true }),
  step('CordPulled', 1000),
  step('CoverRemoved', 2000),
  step('SpotCleaned', 3000, { terminal: 'T1.core' }),
  step('MeterSet', 4000, { setting: 'ohms-200' }),
  step('ProbePlaced', 5000, { probe: 'red', target: 'T1.HV' }),
  step('ProbePlaced', 6000, { probe: 'black', target: 'T1.core' }),
  step('ReadingTaken', 7500, reading),
  step('VerdictGiven', 300_000, { part: 'T1', verdict: 'good' }),
]);

const Held = ({ start }: { start: number }) => {
  const [at, setAt] = useState(start);
  return <ReplayPanel attempt={attempt()} events={events} at={at} onSeek={setAt} />;
};

const watch = async (start: number) => {
  fakeApi().on(getOven, { definition: oven, layout });
  render(
    <MemoryRouter>
      <QueryClientProvider client={createQueryClient()}>
        <Held start={start} />
      </QueryClientProvider>
    </MemoryRouter>,
  );
  await screen.findByRole('region', { name: 'Replay' });
};

const list = () => screen.getByRole('list', { name: 'Events' });
const current = () => within(list()).getByRole('button', { current: 'step' });
const scrubber = () => screen.getByRole('slider', { name: 'Moment of the attempt' });

afterEach(() => vi.useRealTimers());

describe('the replay', () => {
  it('shows the moment it is given: events, tips, the recorded reading', async () => {
    await watch(7);
    expect(current()).toHaveTextContent('00:07');
    expect(scrubber()).toHaveValue('7');
    expect(screen.getByTestId('digits')).toHaveTextContent('94.8');
    expect(screen.getByText('Red on T1.HV high-voltage winding')).toBeInTheDocument();
    expect(screen.getByText('Black on T1.core core, cleaned spot')).toBeInTheDocument();
  });

  it('makes no reading up where none was recorded', async () => {
    await watch(6);
    expect(screen.getByTestId('digits')).toBeEmptyDOMElement();
  });

  it('seeks by scrubber, by the list and step by step', async () => {
    const user = userEvent.setup({ delay: null });
    await watch(0);
    fireEvent.change(scrubber(), { target: { value: '4' } });
    expect(current()).toHaveTextContent('meter to 200 Ω');
    expect(scrubber()).toHaveAttribute('aria-valuetext', '00:04, meter to 200 Ω');
    await user.click(within(list()).getByText(/cord/));
    expect(scrubber()).toHaveValue('1');
    await user.click(screen.getByRole('button', { name: 'One event on' }));
    expect(scrubber()).toHaveValue('2');
    await user.click(screen.getByRole('button', { name: 'One event back' }));
    expect(scrubber()).toHaveValue('1');
  });

  it('stays within the record', async () => {
    await watch(900);
    expect(scrubber()).toHaveValue('8');
    expect(screen.getByRole('button', { name: 'One event on' })).toBeDisabled();
  });

  it('plays at the pace of the bench, faster when asked, and stops at the end', async () => {
    await watch(1);
    vi.useFakeTimers();
    const press = (name: string) => act(() => screen.getByRole('button', { name }).click());
    const pass = (ms: number) => act(() => vi.advanceTimersByTimeAsync(ms));
    await press('Play');
    await pass(990);
    expect(scrubber()).toHaveValue('1');
    await pass(20);
    expect(scrubber()).toHaveValue('2');
    await press('4x');
    await pass(260);
    expect(scrubber()).toHaveValue('3');
    await press('Pause');
    await pass(5000);
    expect(scrubber()).toHaveValue('3');
    await press('Play');
    // 4.5 s of bench time at 4x, then a wait of five minutes shortened to 4 s, at 4x.
    for (let waited = 0; waited < 2000; waited += 100) await pass(100);
    expect(scrubber()).toHaveValue('7');
    for (let waited = 0; waited < 400; waited += 100) await pass(100);
    expect(scrubber()).toHaveValue('8');
    expect(screen.getByRole('button', { name: 'Play' })).toBeInTheDocument();
  });
});
