import { act, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { MeterView } from '../../../shared/bench/reading.ts';
import { Meter } from '../../../src/bench/meter/meter.tsx';
import { benchOnPage, openBenchOnPage, type BenchOnPage } from '../../support/bench-on-page.ts';
import { renderOnBench } from '../../support/render-on-bench.tsx';

const view = (
  display: string,
  more: Partial<MeterView['reading']> = {},
  isSettled = true,
): MeterView => ({
  isSettled,
  reading: {
    display,
    unit: 'Ω',
    value: Number(display),
    counts: 948,
    decimals: 1,
    isBeeping: false,
    isOverRange: false,
    isWarning: false,
    isDestroyed: false,
    ...more,
  },
});

const show = ({ bench }: BenchOnPage, shown: MeterView | null) =>
  act(() => bench.getState().show(shown));

const key = (name: string) => screen.getByRole('button', { name });

describe('the meter', () => {
  it('has one key in use, and another one when it is pressed', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <Meter />);
    expect(key('meter off')).toHaveAttribute('aria-pressed', 'true');
    await user.click(key('200 Ω'));
    expect(key('200 Ω')).toHaveAttribute('aria-pressed', 'true');
    expect(key('meter off')).toHaveAttribute('aria-pressed', 'false');
    expect(page.bench.getState().state.meter.setting).toBe('ohms-200');
    await user.click(key('200 Ω'));
    expect(page.added).toHaveLength(1);
  });

  it('groups its keys: ohms, checks, DC volts, AC volts', () => {
    renderOnBench(benchOnPage(), <Meter />);
    for (const [name, count] of [
      ['Ohms', 7],
      ['Checks', 4],
      ['DC volts', 5],
      ['AC volts', 2],
    ] as const)
      expect(within(screen.getByRole('group', { name })).getAllByRole('button')).toHaveLength(
        count,
      );
  });

  it('shows the digits with what they are: range, unit, settling or settled', async () => {
    const page = openBenchOnPage();
    const { user } = renderOnBench(page, <Meter />);
    await user.click(key('200 Ω'));
    act(() => {
      page.bench.getState().run({ type: 'PlaceProbe', data: { probe: 'red', target: 'T1.HV' } });
      page.bench
        .getState()
        .run({ type: 'PlaceProbe', data: { probe: 'black', target: 'T1.core' } });
    });
    show(page, view('94.8', {}, false));
    expect(screen.getByTestId('digits')).toHaveTextContent('94.8');
    expect(screen.getByText('settling')).toBeInTheDocument();
    show(page, view('94.8'));
    expect(screen.getByText('settled')).toBeInTheDocument();
    expect(screen.getByText('200 Ω')).toBeInTheDocument();
    show(page, view('3.1', { isBeeping: true }));
    expect(screen.getByText('beeps')).toBeInTheDocument();
    show(page, view('812', { isWarning: true }));
    expect(screen.getByText('voltage: nonsense')).toBeInTheDocument();
  });

  it('says what is under each tip, and that varnish is in the way', () => {
    const page = openBenchOnPage();
    renderOnBench(page, <Meter />);
    act(() => {
      page.bench.getState().run({ type: 'PlaceProbe', data: { probe: 'red', target: 'T1.HV' } });
      page.bench
        .getState()
        .run({ type: 'PlaceProbe', data: { probe: 'black', target: 'T1.core' } });
    });
    expect(screen.getByText('T1.HV')).toBeInTheDocument();
    expect(screen.getByText('core, on the varnish')).toBeInTheDocument();
  });

  it('sets REL on a reading and takes it back; without one it says why not', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <Meter />);
    const rel = screen.getByRole('button', { name: /^REL/ });
    await user.click(rel);
    expect(page.bench.getState().notice).toMatchObject({
      text: 'REL needs a reading on the display.',
    });
    await user.click(key('20 V DC'));
    await user.click(rel);
    expect(rel).toHaveAttribute('aria-pressed', 'true');
    await user.click(rel);
    expect(rel).toHaveAttribute('aria-pressed', 'false');
  });

  it('writes the reading on the job sheet', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <Meter />);
    const { run } = page.bench.getState();
    act(() => {
      run({ type: 'SetMeter', data: { setting: 'dc-20' } });
      run({ type: 'PlaceProbe', data: { probe: 'red', target: 'BAT.pos' } });
      run({ type: 'PlaceProbe', data: { probe: 'black', target: 'BAT.neg' } });
    });
    page.pass(1000);
    await user.click(screen.getByRole('button', { name: /Write on job sheet/ }));
    const [reading] = page.bench.getState().state.sheet.readings;
    expect(reading).toMatchObject({
      red: 'BAT.pos',
      black: 'BAT.neg',
      setting: 'dc-20',
      unit: 'V',
    });
    // 12.6 V (PRODUCT section 5) within the meter's 0.5 % + 1.
    expect(Math.abs(Number(reading?.display) - 12.6)).toBeLessThan(0.09);
  });
});
