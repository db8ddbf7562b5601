import { settingOf } from '../instruments/meters.ts';
import type { Storage } from '../engine/circuit/circuit.ts';
import type { TargetRef } from '../oven/oven.ts';
import type { BenchState } from './bench-state.ts';
import { resistor } from './branches.ts';
import { liveVolts } from './live-volts.ts';
import { circuitOf, integrate, pairOf } from './pass-time.ts';
import type { Hazard } from './record.ts';
import type { Setup } from './setup.ts';

export type HazardFound = Omit<Hazard, 'benchMs'>;

/** Ohm, hand to hand through the body, dry, at some hundred volts: order of magnitude, from memory. */
const bodyResistance = 1000;
/** s that a startled hand stays */
const touchSeconds = 0.3;
/** V DC and C: above both a touch is a hazard. ENGINE section 5; 45 uC as quoted from IEC 60335-1 (FACTS 1.3, second hand). */
const touchVolts = 60;
const touchCharge = 45e-6;
/** V AC rms */
const touchVoltsAlternating = 30;
/** Ohm, a screwdriver blade with its two contacts (FACTS 1.2 takes 2 Ohm for the loop) */
const bladeResistance = 2;
/** V on an ohms, diode or beep setting: above the first nonsense, above the second the instrument dies */
const ohmsLiveVolts = 30;
const ohmsDestroyVolts = 600;
const anyDestroyVolts = 1000;

export interface Contact {
  volts: number;
  charge: number;
  energy: number;
  storage: Storage;
}

/** What flows when `resistance` is held between two targets for `seconds`: V before, C and J through it, and what is left stored. */
export function contact(
  setup: Setup,
  state: BenchState,
  [from, to]: readonly [TargetRef, TargetRef],
  resistance: number,
  seconds: number,
): Contact {
  const before = integrate(circuitOf(setup, state), state.storage, 0, [pairOf(state, from, to)]);
  const held = integrate(
    circuitOf(setup, state, [resistor('contact', from, to, resistance)]),
    state.storage,
    seconds,
    [pairOf(state, from, to)],
  );
  const volts = held.samples.values[0] ?? [];
  const sum = (f: (v: number) => number): number =>
    held.samples.time.reduce((total, time, i) => {
      const step = time - (held.samples.time[i - 1] ?? time);
      return total + (step * (f(volts[i] ?? 0) + f(volts[i - 1] ?? volts[i] ?? 0))) / 2;
    }, 0);
  return {
    volts: before.samples.values[0]?.at(-1) ?? 0,
    charge: sum((v) => Math.abs(v)) / resistance,
    energy: sum((v) => v * v) / resistance,
    storage: held.storage,
  };
}

export const bodyContact = (setup: Setup, state: BenchState, at: TargetRef): Contact =>
  contact(setup, state, [at, 'CH.1'], bodyResistance, touchSeconds);

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
    const { volts, charge, energy } = bodyContact(setup, state, at);
    if (Math.abs(volts) > touchVolts && charge > touchCharge) {
      found.push({ kind: 'shock', at, to: null, volts, charge, energy });
    }
  }
  // One charge, one shock: the hand that met the first terminal has emptied it.
  return found.slice(0, 1);
}

/** A blade across two targets. */
export function short(
  setup: Setup,
  state: BenchState,
  pair: readonly [TargetRef, TargetRef],
): HazardFound[] {
  const { volts, charge, energy } = bladeContact(setup, state, pair);
  if (Math.abs(volts) <= touchVolts) return [];
  return [{ kind: 'capacitor-shorted', at: pair[0], to: pair[1], volts, charge, energy }];
}

/** What the meter's tips meet, the moment they land or its setting changes. */
export function meterHazards(setup: Setup, state: BenchState): HazardFound[] {
  const { red, black } = state.probes;
  const setting = settingOf(setup.meter, state.meter.setting);
  if (!red || !black || red === black || state.meter.isDestroyed || !setting) return [];
  const standing = integrate(circuitOf(setup, state), state.storage, 0, [
    pairOf(state, red, black),
  ]);
  const stored = Math.abs(standing.samples.values[0]?.at(-1) ?? 0);
  const live = state.isCordIn ? liveVolts(setup, state, [red, black]) : 0;
  const volts = Math.max(stored, live);
  const hazard = (kind: HazardFound['kind']): HazardFound[] => [
    { kind, at: red, to: black, volts, charge: 0, energy: 0 },
  ];
  const isPassive =
    setting.function !== 'ohms' && setting.function !== 'beep' && setting.function !== 'diode';
  if (volts > (isPassive ? anyDestroyVolts : ohmsDestroyVolts)) return hazard('meter-destroyed');
  if (!isPassive && volts > ohmsLiveVolts) return hazard('ohms-on-live');
  return live > touchVoltsAlternating ? hazard('live-probing') : [];
}
