import { settingOf } from '../instruments/meters.ts';
import type { Storage } from '../engine/circuit/circuit.ts';
import type { TargetRef } from '../oven/oven.ts';
import type { BenchState } from './bench-state.ts';
import { resistor } from './branches.ts';
import { liveVolts } from './live-volts.ts';
import { circuitOf, integrate, pairOf } from './pass-time.ts';
import type { Hazard } from './record.ts';
import type { Setup } from './setup.ts';
import { fingersBranch } from './test-leads.ts';

export type HazardFound = Omit<Hazard, 'benchMs'>;

/** Ohm, hand to hand through the body, dry, at some hundred volts: order of magnitude, from memory. */
const bodyResistance = 1000;
/** s that a startled hand stays */
const touchSeconds = 0.3;
/** V DC and C: above both a touch is a hazard. ENGINE section 5; 45 uC as quoted from IEC 60335-1 (FACTS 1.3, second hand). */
const touchVolts = 60;
const touchCharge = 45e-6;
/** C that a meter on ohms takes up without harm or a warning. Judgement. */
const noticedCharge = 5e-6;
/** V AC rms */
const touchVoltsAlternating = 30;
/** Ohm, a screwdriver blade with its two contacts (FACTS 1.2 takes 2 Ohm for the loop) */
const bladeResistance = 2;

export interface Contact {
  charge: number;
  energy: number;
  storage: Storage;
}

/** Charge stands on capacitors alone: what a winding still carries of a meter's current is no danger. */
const still = (state: BenchState): BenchState => ({
  ...state,
  storage: { voltages: state.storage.voltages, currents: {} },
});

/** V of stored charge between two targets, before anything bridges them. */
export function standingVolts(
  setup: Setup,
  state: BenchState,
  [a, b]: readonly [TargetRef, TargetRef],
): number {
  const { storage } = still(state);
  const result = integrate(circuitOf(setup, state), storage, 0, [pairOf(state, a, b)]);
  return result.samples.values[0]?.at(-1) ?? 0;
}

/** What flows when `resistance` is held between two targets for `seconds`: C and J through it, and what is left stored. */
export function contact(
  setup: Setup,
  state: BenchState,
  [from, to]: readonly [TargetRef, TargetRef],
  resistance: number,
  seconds: number,
): Contact {
  const held = integrate(
    circuitOf(setup, state, [resistor('contact', from, to, resistance)]),
    state.storage,
    seconds,
    [pairOf(state, from, to)],
  );
  const { time } = held.samples;
  const volts = held.samples.values[0] ?? [];
  const sum = (f: (v: number) => number): number =>
    time.reduce((total, at, i) => {
      const width = at - (time[i - 1] ?? at);
      return total + (width * (f(volts[i] ?? 0) + f(volts[i - 1] ?? volts[i] ?? 0))) / 2;
    }, 0);
  return {
    charge: sum((v) => Math.abs(v)) / resistance,
    energy: sum((v) => v * v) / resistance,
    storage: held.storage,
  };
}

/** From `at` through the body to `to`: the other hand, on the chassis unless it holds something else. */
export const bodyContact = (
  setup: Setup,
  state: BenchState,
  at: TargetRef,
  to: TargetRef = 'CH.1',
): Contact => contact(setup, state, [at, to], bodyResistance, touchSeconds);

export const bladeContact = (
  setup: Setup,
  state: BenchState,
  pair: readonly [TargetRef, TargetRef],
): Contact => contact(setup, state, pair, bladeResistance, 0.05);

/** A bare hand meets these targets, the other hand on the chassis. */
export function touch(
  setup: Setup,
  state: BenchState,
  targets: readonly TargetRef[],
): HazardFound[] {
  const found: HazardFound[] = [];
  for (const at of targets) {
    if (state.isCordIn) {
      const volts = liveVolts(setup, state, [at, 'CH.1']);
      if (volts > touchVoltsAlternating) {
        found.push({ kind: 'mains-exposed', at, to: null, volts, charge: 0, energy: 0 });
        continue;
      }
    }
    const volts = standingVolts(setup, state, [at, 'CH.1']);
    if (Math.abs(volts) <= touchVolts) continue;
    const { charge, energy } = bodyContact(setup, state, at);
    if (charge > touchCharge) {
      found.push({ kind: 'shock', at, to: null, volts, charge, energy });
    }
  }
  // One charge, one shock: the hand that met the first terminal has emptied it.
  return found.slice(0, 1);
}

/** Both tips with fingers on their metal, as they are in `after`: one hand to the other, the chassis out of it. */
export function pinch(setup: Setup, state: BenchState, after: BenchState): HazardFound[] {
  const body = fingersBranch(after);
  if (!body) return [];
  const { from: at, to } = body;
  const live = state.isCordIn ? liveVolts(setup, state, [at, to]) : 0;
  if (live > touchVoltsAlternating) {
    return [{ kind: 'mains-exposed', at, to, volts: live, charge: 0, energy: 0 }];
  }
  const volts = standingVolts(setup, state, [at, to]);
  if (Math.abs(volts) <= touchVolts) return [];
  const { charge, energy } = bodyContact(setup, state, at, to);
  return charge > touchCharge ? [{ kind: 'shock', at, to, volts, charge, energy }] : [];
}

/** A blade across two targets. */
export function short(
  setup: Setup,
  state: BenchState,
  pair: readonly [TargetRef, TargetRef],
): HazardFound[] {
  const volts = standingVolts(setup, state, pair);
  if (Math.abs(volts) <= touchVolts) return [];
  const { charge, energy } = bladeContact(setup, state, pair);
  return [{ kind: 'capacitor-shorted', at: pair[0], to: pair[1], volts, charge, energy }];
}

/** Whether more stands behind stored volts than the nanofarads of a filter, which empty into a meter unnoticed. */
const isBacked = (
  setup: Setup,
  state: BenchState,
  pair: readonly [TargetRef, TargetRef],
  live: number,
): boolean => {
  if (live > touchVoltsAlternating) return true;
  const withoutMeter = { ...still(state), probes: { red: null, black: null } };
  return contact(setup, withoutMeter, pair, bodyResistance, touchSeconds).charge > noticedCharge;
};

/** What the meter's tips meet, the moment they land or its setting changes. */
export function meterHazards(setup: Setup, state: BenchState): HazardFound[] {
  const { red, black } = state.probes;
  const setting = settingOf(setup.meter, state.meter.setting);
  if (
    !red ||
    !black ||
    red === black ||
    state.meter.isDestroyed ||
    !setting ||
    setting.function === 'off'
  )
    return [];
  const stored = Math.abs(standingVolts(setup, state, [red, black]));
  const live = state.isCordIn ? liveVolts(setup, state, [red, black]) : 0;
  const volts = Math.max(stored, live);
  const hazard = (kind: HazardFound['kind']): HazardFound[] => [
    { kind, at: red, to: black, volts, charge: 0, energy: 0 },
  ];
  const isDriving = setting.function !== 'dc-volts' && setting.function !== 'ac-volts';
  const { limits } = setup.meter;
  if (volts > (isDriving ? limits.passive : limits.any)) return hazard('meter-destroyed');
  if (isDriving && volts > limits.warning && isBacked(setup, state, [red, black], live))
    return hazard('ohms-on-live');
  return live > touchVoltsAlternating ? hazard('live-probing') : [];
}
