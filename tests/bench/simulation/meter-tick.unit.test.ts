import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { MeterView } from '../../../shared/bench/reading.ts';
import { sameThread, type BenchThread } from '../../../src/simulation/bench-thread.ts';
import { meterTick } from '../../../src/simulation/meter-tick.ts';
import { openBenchOnPage, type BenchOnPage } from '../../support/bench-on-page.ts';

beforeEach(() => {
  vi.useFakeTimers();
  return () => vi.useRealTimers();
});

const seconds = async ({ pass }: BenchOnPage, n: number) => {
  for (let i = 0; i < n * 10; i += 1) {
    pass(100);
    await vi.advanceTimersByTimeAsync(100);
  }
};

const readingsOf = ({ added }: BenchOnPage) =>
  added.flat().filter(({ type }) => type === 'ReadingTaken');

/** Probes on both ends of the primary of T1, one of its leads lifted. */
const onPrimary = (setting: string, more: Parameters<typeof openBenchOnPage>[1] = {}) => {
  const page = openBenchOnPage([], more);
  const { run } = page.bench.getState();
  run({ type: 'LiftLead', data: { end: 'W11/b' } });
  run({ type: 'SetMeter', data: { setting } });
  run({ type: 'PlaceProbe', data: { probe: 'red', target: 'T1.1' } });
  run({ type: 'PlaceProbe', data: { probe: 'black', target: 'T1.2' } });
  page.added.length = 0;
  return page;
};

const view = (counts: number | null, isSettled = true): MeterView => ({
  isSettled,
  reading: {
    display: counts === null ? 'OL' : String(counts / 10),
    unit: 'Ω',
    value: counts === null ? null : counts / 10,
    counts,
    decimals: 1,
    isBeeping: false,
    isOverRange: counts === null,
    isWarning: false,
    isDestroyed: false,
  },
});

/** A meter whose display the test decides: when something is read is what is tested here, not what. */
function scripted(
  shown: () => MeterView | null,
): Pick<BenchThread, 'read' | 'stop'> & { asked: number[]; isStopped: boolean } {
  const reader = {
    asked: [] as number[],
    isStopped: false,
    read: (_state: unknown, atMs: number) => {
      reader.asked.push(atMs);
      return Promise.resolve(shown());
    },
    stop: () => {
      reader.isStopped = true;
    },
  };
  return reader;
}

describe('the live display', () => {
  it('shows what the circuit gives: 0.55 Ohm of winding (ENGINE 3) and 0.16 Ohm of test leads', async () => {
    const page = onPrimary('ohms-200');
    const stop = meterTick(page.bench, sameThread(page.bench.getState().setup));
    page.pass(2000);
    await vi.advanceTimersByTimeAsync(334);
    const shown = page.bench.getState().view;
    expect(shown?.isSettled).toBe(true);
    expect(Math.abs(Number(shown?.reading.display) - 0.7)).toBeLessThan(0.31);
    expect(readingsOf(page)[0]?.data).toMatchObject({ red: 'T1.1', black: 'T1.2', unit: 'Ω' });
    stop();
  });

  it('is dark while the meter is off, OL on ohms with a tip in the air, and runs no circuit for either', async () => {
    const page = openBenchOnPage();
    const reader = scripted(() => view(5));
    const stop = meterTick(page.bench, reader);
    await seconds(page, 1);
    expect(page.bench.getState().view).toBeNull();
    page.bench.getState().run({ type: 'SetMeter', data: { setting: 'ohms-200' } });
    await seconds(page, 1);
    expect(page.bench.getState().view?.reading.display).toBe('OL');
    expect(reader.asked).toEqual([]);
    expect(readingsOf(page)).toEqual([]);
    stop();
  });

  it('reads three times a second', async () => {
    const page = onPrimary('ohms-200');
    const reader = scripted(() => view(7, false));
    const stop = meterTick(page.bench, reader);
    await seconds(page, 2);
    expect(reader.asked.length).toBeGreaterThanOrEqual(6);
    expect(reader.asked.length).toBeLessThanOrEqual(8);
    stop();
    expect(reader.isStopped).toBe(true);
  });

  it('drops an answer about a bench that has changed meanwhile, and asks again at once', async () => {
    const page = onPrimary('ohms-200');
    const answers: ((shown: MeterView) => void)[] = [];
    const reader: Pick<BenchThread, 'read' | 'stop'> = {
      read: () => new Promise((resolve) => answers.push(resolve)),
      stop: () => undefined,
    };
    const stop = meterTick(page.bench, reader);
    page.bench.getState().run({ type: 'PlaceProbe', data: { probe: 'black', target: 'T1.core' } });
    answers[0]?.(view(7));
    await vi.advanceTimersByTimeAsync(1);
    expect(page.bench.getState().view).toBeNull();
    expect(answers).toHaveLength(2);
    answers[1]?.(view(null, false));
    await vi.advanceTimersByTimeAsync(1);
    expect(page.bench.getState().view?.reading.display).toBe('OL');
    stop();
  });
});

describe('what stands still goes on record', () => {
  it('not before it has settled, then once, though the last digit dithers', async () => {
    const page = onPrimary('ohms-200');
    let counts = 8;
    let isSettled = false;
    const stop = meterTick(
      page.bench,
      scripted(() => view((counts = counts === 8 ? 9 : 8), isSettled)),
    );
    await seconds(page, 1);
    expect(readingsOf(page)).toEqual([]);
    isSettled = true;
    await seconds(page, 3);
    expect(readingsOf(page)).toHaveLength(1);
    stop();
  });

  it('again when a tip has moved, or the number has', async () => {
    const page = onPrimary('ohms-200');
    let counts = 8;
    const stop = meterTick(
      page.bench,
      scripted(() => view(counts)),
    );
    await seconds(page, 1);
    page.bench.getState().run({ type: 'PlaceProbe', data: { probe: 'black', target: 'T1.core' } });
    await seconds(page, 1);
    counts = 500;
    await seconds(page, 1);
    expect(readingsOf(page).map(({ data }) => data['black'])).toEqual([
      'T1.2',
      'T1.core',
      'T1.core',
    ]);
    stop();
  });

  it.each(['read-only', 'refused'] as const)('not while the record is %s', async (kind) => {
    const page = onPrimary('ohms-200');
    page.bench
      .getState()
      .setSave(kind === 'refused' ? { kind, why: 'no', steps: 1 } : { kind, why: 'no' });
    const stop = meterTick(
      page.bench,
      scripted(() => view(7)),
    );
    await seconds(page, 2);
    expect(page.bench.getState().view?.reading.display).toBe('0.7');
    expect(readingsOf(page)).toEqual([]);
    expect(page.bench.getState().notice).toBeNull();
    stop();
  });
});

describe('an auto-ranging meter', () => {
  const settingOf = ({ bench }: BenchOnPage) => bench.getState().state.meter.setting;

  it('goes one range up when it is over, one down when it uses few of its counts', async () => {
    const page = onPrimary('ohms-6k', { meter: 'auto-6000' });
    let counts: number | null = null;
    const stop = meterTick(
      page.bench,
      scripted(() => view(counts, false)),
    );
    await seconds(page, 0.2);
    expect(settingOf(page)).not.toBe('ohms-6k');
    counts = 100;
    await seconds(page, 4);
    expect(settingOf(page)).toBe('ohms-600');
    stop();
  });

  it('holds its range while REL is on', async () => {
    const page = onPrimary('ohms-6k', { meter: 'auto-6000' });
    page.pass(1000);
    expect(page.bench.getState().run({ type: 'SetRelative', data: {} })).toBe(true);
    const stop = meterTick(
      page.bench,
      scripted(() => view(null)),
    );
    await seconds(page, 2);
    expect(settingOf(page)).toBe('ohms-6k');
    stop();
  });
});
