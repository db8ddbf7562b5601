import { transient } from '../../engine/analyses/transient.ts';
import { phasor } from '../../engine/analyses/phasor.ts';
import type { Gathered } from '../../engine/analyses/summarise.ts';
import type { Circuit, Storage } from '../../engine/circuit/circuit.ts';
import { condense } from '../../engine/circuit/condense.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { PartKindName } from '../../oven/oven.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import { energisedCircuit } from './energised-circuit.ts';
import { withoutParasitics } from './without-parasitics.ts';
import { magnitude } from '../../engine/elementary/magnitude.ts';

/** s of mains averaged at the end of a run */
const averaged = 0.1;

/** of one step; means over six cycles come out to half a hundredth */
const relativeTolerance = 1e-2;

/** A at the plug under which nothing is fed: an open gap of every part leaks less */
const deadAmps = 1e-3;

export interface Electrical {
  /** A rms */ current: (element: string) => number;
  /** W */ power: (element: string) => number;
  storage: Storage;
}

export const refsOf = (oven: DrawnOven, kind: PartKindName): string[] =>
  oven.definition.parts.filter((part) => part.kind === kind).map((part) => part.ref);

/** Elements whose current or power a run is judged by, as the kinds of parts name them. */
function lookedAt(oven: DrawnOven): { currents: string[]; powers: string[] } {
  const all = oven.definition.parts.map(({ ref, kind }) => {
    const { melts, turns, hums, powers = [] } = partKinds[kind].running ?? {};
    const currents = [melts, turns?.winding, hums].filter((name) => name !== undefined);
    const named = (inner: string): string => `${ref}:${inner}`;
    return { currents: currents.map(named), powers: powers.map(named) };
  });
  return {
    currents: ['mains:loop', ...all.flatMap(({ currents }) => currents)],
    powers: all.flatMap(({ powers }) => powers),
  };
}

/** `settling` s of mains through the oven in this state, less the parts of some kinds, and what flowed in the last tenth of a second. `charged`: V on capacitors to begin with. */
export function runElectrically(
  oven: DrawnOven,
  state: OvenState,
  settling: number,
  leftOut: readonly PartKindName[] = [],
  charged: Readonly<Record<string, number>> = {},
): Electrical {
  const { currents, powers } = lookedAt(oven);
  const absent = leftOut.flatMap((kind) => refsOf(oven, kind));
  const whole = without(withoutParasitics(energisedCircuit(oven, state)), absent);
  const circuit = condense(whole, new Set([...currents, ...powers]));
  const ran = transient(circuit, {
    relativeTolerance,
    stop: settling,
    storage: { voltages: charged, currents: {} },
    observe: { from: settling - averaged, currents, powers },
  });
  if (!ran.ok) throw new Error(`powered run: ${ran.failure.message}`);
  const { summary, storage } = ran.value;
  const of = (all: Record<string, Gathered> | undefined, element: string): Gathered | undefined =>
    all?.[element];
  return {
    current: (element) => of(summary?.currents, element)?.rms ?? 0,
    power: (element) => of(summary?.powers, element)?.mean ?? 0,
    storage,
  };
}

/** Whether nothing is fed any more, whatever is switched on: under a milliampere at the plug, by phasors. */
export function isDead(oven: DrawnOven, state: OvenState): boolean {
  const solved = phasor(energisedCircuit(oven, state), [oven.definition.supply.hertz]);
  if (!solved.ok) throw new Error(`supply: ${solved.failure.message}`);
  const [re, im] = solved.value.currents['mains:loop']?.[0] ?? [0, 0];
  return re * re + im * im < deadAmps * deadAmps;
}

/** A rms through each magnetron's heater before anything conducts at high voltage: linear, so by phasors. */
export function heaterCurrents(oven: DrawnOven, state: OvenState): Record<string, number> {
  const solved = phasor(energisedCircuit(oven, state), [oven.definition.supply.hertz]);
  if (!solved.ok) throw new Error(`heaters: ${solved.failure.message}`);
  return Object.fromEntries(
    refsOf(oven, 'magnetron').map((ref) => {
      const [re, im] = solved.value.currents[`${ref}:heater`]?.[0] ?? [0, 0];
      return [ref, magnitude(re, im)];
    }),
  );
}

/** The circuit without the elements of these parts. */
const without = ({ elements }: Circuit, refs: readonly string[]): Circuit => ({
  elements: elements.filter(({ name }) => !refs.includes(name.split(/[:.]/)[0] ?? '')),
});
