import { transient } from '../../engine/analyses/transient.ts';
import { phasor } from '../../engine/analyses/phasor.ts';
import type { Gathered } from '../../engine/analyses/summarise.ts';
import type { Circuit, Storage } from '../../engine/circuit/circuit.ts';
import { condense } from '../../engine/circuit/condense.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { PartKindName } from '../../oven/oven.ts';
import { energisedCircuit } from './energised-circuit.ts';
import { withoutParasitics } from './without-parasitics.ts';
import { magnitude } from '../../engine/elementary/magnitude.ts';

/** s of mains averaged at the end of a run */
const averaged = 0.1;

/** of one step; means over six cycles come out to half a hundredth */
const relativeTolerance = 1e-2;

export interface Electrical {
  /** A rms */ current: (element: string) => number;
  /** W */ power: (element: string) => number;
  storage: Storage;
}

export const refsOf = (oven: DrawnOven, kind: PartKindName): string[] =>
  oven.definition.parts.filter((part) => part.kind === kind).map((part) => part.ref);

/** `settling` s of mains through the oven in this state, less the parts of some kinds, and what flowed in the last tenth of a second. */
export function runElectrically(
  oven: DrawnOven,
  state: OvenState,
  settling: number,
  leftOut: readonly PartKindName[] = [],
): Electrical {
  const named = (kind: PartKindName, inner: string): string[] =>
    refsOf(oven, kind).map((ref) => `${ref}:${inner}`);
  const currents = [
    'mains:loop',
    ...named('fuse', 'element'),
    ...named('hv-transformer', 'primary'),
    ...named('motor', 'winding'),
  ];
  const powers = [
    ...named('control-board', 'load'),
    ...named('control-board', 'filament'),
    ...named('lamp', 'filament'),
    ...named('magnetron', 'beam'),
    ...named('magnetron', 'threshold'),
  ];
  const absent = leftOut.flatMap((kind) => refsOf(oven, kind));
  const whole = without(withoutParasitics(energisedCircuit(oven, state)), absent);
  const circuit = condense(whole, new Set([...currents, ...powers]));
  const ran = transient(circuit, {
    relativeTolerance,
    stop: settling,
    storage: { voltages: {}, currents: {} },
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
