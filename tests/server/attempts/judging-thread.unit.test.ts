import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Worker } from 'node:worker_threads';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { attemptRules } from '../../../server/attempts/attempt-rules.ts';
import { directJudge, type BenchSetup, type Judge } from '../../../server/attempts/judge.ts';
import { JudgingThread } from '../../../server/attempts/judging-thread.ts';
import { startJudge } from '../../../server/attempts/start-judge.ts';
import { threadedJudge } from '../../../server/attempts/threaded-judge.ts';
import { handsAtHum } from '../../support/server-attempts.ts';
import { recorded } from '../../support/bench.ts';
import { hum, readAllOvens, root } from '../../support/server-content.ts';

/** the server's own entry, from its sources */
const entry = pathToFileURL(join(root, 'server', 'main.ts'));
const startWorker = (): Worker => startJudge(entry);

/** ms: the thread compiles what it loads */
const patience = 60_000;

let thread: JudgingThread;
let judge: Judge;
let bench: BenchSetup;
const here = directJudge(attemptRules);

beforeAll(async () => {
  thread = new JudgingThread(startWorker);
  judge = threadedJudge(here, [thread]);
  const definition = (await readAllOvens()).find(hum.oven)?.definition;
  if (!definition) throw new Error('the oven is not there');
  const setup = attemptRules.setUp(definition, hum, 417);
  bench = { definition, content: hum, seed: 417, setup };
});

afterAll(() => thread.stop());

describe('the other thread answers as this one does', { timeout: patience }, () => {
  test('how an attempt begins', async () => {
    expect(await judge.begin(bench)).toEqual(await here.begin(bench));
  });

  test('whether a pulled cord can have happened', async () => {
    const hands = handsAtHum(417);
    const before = hands.state();
    const events = hands.does('PullCord', {});
    const there = await judge.verify(bench, before, events);
    expect(there.ok).toBe(true);
    expect(there).toEqual(await here.verify(bench, before, events));
    const twice = await judge.verify(bench, hands.state(), events);
    expect(twice.ok).toBe(false);
    expect(twice).toEqual(await here.verify(bench, hands.state(), events));
  });

  test('what an attempt is worth', async () => {
    const hands = handsAtHum(417);
    hands.does('StateCause', { causes: [{ on: 'D1', fault: 'shorted' }] });
    hands.does('HandIn', {});
    const events = recorded(hands.events());
    expect(await judge.assess(bench, events)).toEqual(await here.assess(bench, events));
  });
});

test('what is quick is judged here, without the thread', async () => {
  const idle = new JudgingThread(() => {
    throw new Error('the thread was started');
  });
  const hands = handsAtHum(417);
  const before = hands.state();
  const events = hands.does('SetMeter', { setting: 'beep' });
  const judging = threadedJudge(here, [idle]);
  expect(await judging.verify(bench, before, events)).toMatchObject({ ok: true });
  // With the cord in, a door that moves runs the circuit on mains.
  const opening = hands.does('OpenDoor', {});
  await expect(async () => judging.verify(bench, before, opening)).rejects.toThrow('was started');
});

test(
  'what the rules throw there is thrown here, and the next task is done',
  { timeout: patience },
  async () => {
    const unknown = { ...bench, content: { ...hum, meter: 'no-such-meter' as never } };
    await expect(judge.begin(unknown)).rejects.toThrow('no-such-meter');
    expect(await judge.begin(bench)).toMatchObject({ event: { type: 'AttemptBegan' } });
  },
);

test(
  'a thread that breaks down fails what it was at; the next task starts another',
  { timeout: patience },
  async () => {
    const workers: Worker[] = [];
    const fragile = new JudgingThread(() => {
      const worker = startWorker();
      workers.push(worker);
      return worker;
    });
    const task = {
      kind: 'begin',
      pinned: { definition: bench.definition, content: hum, seed: 1 },
    } as const;
    const lost = fragile.ask<'begin'>(task);
    await workers[0]?.terminate();
    await expect(lost).rejects.toThrow('the judging thread ended');
    expect(fragile.load).toBe(0);
    expect((await fragile.ask<'begin'>(task)).event.type).toBe('AttemptBegan');
    expect(workers).toHaveLength(2);
    await fragile.stop();
  },
);
