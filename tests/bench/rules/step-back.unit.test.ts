import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { assess } from '../../../shared/assessment/assess.ts';
import { begin } from '../../../shared/bench/begin.ts';
import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { BenchCommand } from '../../../shared/bench/catalogue.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { fold } from '../../../shared/bench/fold.ts';
import { runCommand } from '../../../shared/bench/run-command.ts';
import { withoutUndone } from '../../../shared/bench/undone.ts';
import { verify } from '../../../shared/bench/verify.ts';
import { replay } from '../../../src/bench/replay/replay.ts';
import { handsOn, opened, reads, recorded, setupWith } from '../../support/bench.ts';

const charged = [{ on: 'V1', fault: 'heater-open' }] as const;
const guided = setupWith(charged, { lastRunSecondsAgo: 5, condition: 'guided' });

/** An open oven whose capacitor still stands high, and a hand that has just met it. */
const shocked = (setup = guided) => {
  const hands = opened(handsOn(setup));
  const before = hands.state();
  hands.does('LiftLead', { end: 'W24/a' });
  return { hands, before };
};

const kinds = ({ hazards }: BenchState): string[] => hazards.map(({ kind }) => kind);

describe('stepping back in guided practice', () => {
  it('brings the bench back to before the hand went wrong, and keeps the hazard on record', () => {
    const { hands, before } = shocked();
    const stored = before.storage.voltages['C1:foils'] ?? 0;
    expect(hands.state().oven.leadEnds['W24/a']).toBeNull();
    expect(Math.abs(hands.state().storage.voltages['C1:foils'] ?? 0)).toBeLessThan(
      Math.abs(stored),
    );
    const [event] = hands.does('StepBack', {}, 30);
    expect(event).toMatchObject({ type: 'SteppedBack', data: { undone: 'LeadLifted' } });
    const after = hands.state();
    expect(after.oven).toEqual(before.oven);
    // 2 s before the hand met it, through the bleeder: 10 MOhm x 0.95 uF, some fifth of a time constant.
    expect(Math.abs(after.storage.voltages['C1:foils'] ?? 0)).toBeGreaterThan(
      0.75 * Math.abs(stored),
    );
    expect(kinds(after)).toEqual(['shock']);
    expect(after.benchMs).toBe(event?.benchMs);
  });

  it('lets the hand do it again, with the same charge waiting', () => {
    const { hands } = shocked();
    const first = hands.events().at(-1);
    hands.does('StepBack', {}, 0);
    const again = hands.does('LiftLead', { end: 'W24/a' }, 0);
    expect(again.map(({ type }) => type)).toEqual(['LeadLifted', 'HazardHappened']);
    expect(again[1]?.data['volts']).toBeCloseTo(Number(first?.data['volts']), 6);
    expect(kinds(hands.state())).toEqual(['shock', 'shock']);
  });

  it('brings back a meter that was destroyed', () => {
    const hands = opened(handsOn(guided));
    hands.does('SetMeter', { setting: 'ohms-200' }, 0);
    hands.does('PlaceProbe', { probe: 'black', target: 'C1.1' }, 0);
    const met = hands.does('PlaceProbe', { probe: 'red', target: 'C1.2' }, 0);
    expect(met[1]?.data).toMatchObject({ kind: 'meter-destroyed' });
    hands.does('StepBack', {});
    expect(hands.state()).toMatchObject({
      meter: { isDestroyed: false, setting: 'ohms-200' },
      probes: { red: null, black: 'C1.1' },
    });
  });

  it('stays open while the meter shows what it shows, and until something is done', () => {
    const hands = opened(handsOn(setupWith([], { condition: 'guided' })));
    hands.does('SetMeter', { setting: 'dc-20' });
    hands.does('PlaceProbe', { probe: 'red', target: 'BAT.pos' });
    hands.does('PlaceProbe', { probe: 'black', target: 'BAT.neg' });
    hands.does('PlugCord', {});
    hands.does('TakeReading', {});
    expect(hands.state().wayBack).toMatchObject({ isOffered: true, done: 'CordPlugged' });
    hands.does('InspectPart', { part: 'F1' });
    expect(hands.isRefused('StepBack', {})).toBe('nothing-to-undo');
  });

  it('stays open while an auto-ranging meter changes its range', () => {
    const hands = opened(handsOn(setupWith([], { condition: 'guided', meter: 'auto-6000' })));
    hands.does('SetMeter', { setting: 'dc-6' });
    hands.does('PlugCord', {});
    hands.does('SetMeter', { setting: 'dc-60' });
    expect(hands.state().wayBack?.isOffered).toBe(true);
    hands.does('SetMeter', { setting: 'beep' });
    expect(hands.state().wayBack?.isOffered).toBe(false);
  });

  it('is refused before any hazard, twice, and in the other conditions', () => {
    const { hands } = shocked();
    hands.does('StepBack', {});
    expect(hands.isRefused('StepBack', {})).toBe('nothing-to-undo');
    expect(handsOn(guided).isRefused('StepBack', {})).toBe('nothing-to-undo');
    for (const condition of ['unaided', 'assessed'] as const) {
      const setup = setupWith(charged, { lastRunSecondsAgo: 5, condition });
      expect(shocked(setup).hands.isRefused('StepBack', {})).toBe('no-way-back');
    }
  });
});

describe('the record of a step back', () => {
  it('is taken when the rules give it, and refused where they do not', () => {
    const { hands } = shocked();
    hands.does('StepBack', {});
    const events = hands.events().slice(1);
    const { state } = begin(guided);
    expect(verify(guided, state, events)).toMatchObject({
      ok: true,
      state: { oven: hands.state().oven, hazards: hands.state().hazards },
    });
    const unaided = setupWith(charged, { lastRunSecondsAgo: 5 });
    expect(verify(unaided, begin(unaided).state, events)).toMatchObject({
      ok: false,
      reason: 'cannot-have-happened',
      message: 'Only guided practice lets you step back.',
    });
    const claimed = events.map((event) =>
      event.type === 'SteppedBack' ? { ...event, data: { ...event.data, doneAtMs: 1 } } : event,
    );
    expect(verify(guided, state, claimed)).toMatchObject({ ok: false, index: events.length - 1 });
  });

  it('shows the same bench in the replay', () => {
    const { hands, before } = shocked();
    hands.does('StepBack', {});
    const events = recorded(hands.events());
    const then = replay(guided, events).stateAt(events.length - 1);
    expect(then.oven).toEqual(before.oven);
    expect(kinds(then)).toEqual(['shock']);
  });

  it('leaves out what was taken back, never its hazard', () => {
    const { hands } = shocked();
    reads(hands, 'dc-200', 'BAT.pos', 'BAT.neg');
    const all = shocked().hands;
    all.does('StepBack', {});
    const types = withoutUndone(all.events()).map(({ type }) => type);
    expect(types).not.toContain('LeadLifted');
    expect(types.slice(-2)).toEqual(['HazardHappened', 'SteppedBack']);
    expect(withoutUndone(hands.events())).toEqual(hands.events());
  });

  it('costs its marks in the debrief, but what was taken back is judged neither well nor badly', () => {
    const { hands } = shocked();
    hands.does('StepBack', {});
    hands.does('GiveVerdict', { part: 'V1', verdict: 'faulty' });
    hands.does('HandIn', {});
    const debrief = assess(guided, recorded(hands.events()));
    const why = (skill: string) =>
      debrief.skills.find((one) => one.skill === skill)?.marks.map((mark) => mark.why);
    expect(why('make safe')).toContain('Hazard: shock.');
    expect(debrief.isSafe).toBe(false);
    expect(why('isolate')).toEqual([]);
  });
});

const commands: BenchCommand[] = [
  { type: 'LiftLead', data: { end: 'W24/a' } },
  { type: 'RefitLead', data: { end: 'W24/a', terminal: 'C1.2' } },
  { type: 'PlaceProbe', data: { probe: 'red', target: 'C1.1' } },
  { type: 'PlaceProbe', data: { probe: 'black', target: 'C1.2' } },
  { type: 'RemoveProbe', data: { probe: 'red' } },
  { type: 'SetMeter', data: { setting: 'ohms-200' } },
  { type: 'SetMeter', data: { setting: 'dc-1000' } },
  { type: 'TakeReading', data: {} },
  { type: 'PlugCord', data: {} },
  { type: 'PullCord', data: {} },
  { type: 'ShortWithScrewdriver', data: { from: 'C1.1', to: 'CH.2' } },
  { type: 'StepBack', data: {} },
];

describe('any attempt with steps back in it', () => {
  const begun = opened(handsOn(guided));

  it('folds to the same bench from a checkpoint as from the beginning', () => {
    fc.assert(
      fc.property(
        fc.array(fc.constantFrom(...commands), { minLength: 4, maxLength: 9 }),
        fc.nat(),
        (asked, cut) => {
          const events: WireEvent[] = [...begun.events()];
          let state = begun.state();
          for (const command of asked) {
            const ran = runCommand(guided, state, command, state.benchMs + 700);
            if (!ran.ok) continue;
            events.push(...ran.events);
            state = ran.state;
          }
          const at = 1 + (cut % events.length);
          const checkpoint = fold(guided, events.slice(0, at));
          const kept = JSON.parse(JSON.stringify(checkpoint)) as BenchState;
          expect(fold(guided, events.slice(at), kept)).toEqual(fold(guided, events));
          expect(state.hazards).toHaveLength(
            events.filter(({ type }) => type === 'HazardHappened').length,
          );
        },
      ),
      { numRuns: 12, seed: 2611 },
    );
  }, 120_000);
});
