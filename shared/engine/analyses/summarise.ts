import type { NodeName } from '../circuit/circuit.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Integrator } from './integrator.ts';
import type { Watch } from './march.ts';

/** What to gather over a window of time. */
export interface Observe {
  /** s; 0 unless told */ from?: number;
  /** s; the end unless told */ to?: number;
  /** pairs (a, b) whose V(a) - V(b) is gathered */ pairs?: readonly (readonly [
    NodeName,
    NodeName,
  ])[];
  /** names of elements whose current is gathered, A */ currents?: readonly string[];
  /** names of elements whose power is gathered: W taken up, negative for a source that gives */
  powers?: readonly string[];
}

export interface Gathered {
  mean: number;
  rms: number;
  /** the value furthest from zero, with its sign */ peak: number;
}

export interface Summary {
  /** V, one for each pair asked for */ pairs: Gathered[];
  /** A by element */ currents: Record<string, Gathered>;
  /** W by element */ powers: Record<string, Gathered>;
}

interface Quantity {
  value(): number;
  readonly atStage: Float64Array;
  sum: number;
  squares: number;
  peak: number;
}

/** Gathers means, rms values and peaks step by step, by the method's own quadrature over its stages. */
export function summarise(
  integrator: Integrator,
  observe: Observe,
  window: { from: number; to: number },
): { watch: Watch; summary(): Summary } {
  const { machine, tableau } = integrator;
  const { netlist, system } = machine;
  const quantity = (value: () => number): Quantity => ({
    value,
    atStage: new Float64Array(tableau.stages),
    sum: 0,
    squares: 0,
    peak: 0,
  });
  const between = (first: number, second: number) => () => system.x[first]! - system.x[second]!;
  const indexOf = (node: string): number => netlist.nodeIndex.get(node) ?? netlist.size;
  const branchOf = (name: string): number => netlist.branchIndex.get(name) ?? -1;
  const currentOf = (k: number) => () => (k < 0 ? 0 : system.x[netlist.nodeCount + k]! / REFERENCE);
  const powerOf = (k: number) => {
    if (k < 0) return () => 0;
    const volts = between(netlist.from[k]!, netlist.to[k]!);
    const amperes = currentOf(k);
    return () => volts() * amperes();
  };
  const pairs = (observe.pairs ?? []).map(([a, b]) => quantity(between(indexOf(a), indexOf(b))));
  const currents = (observe.currents ?? []).map((name) => quantity(currentOf(branchOf(name))));
  const powers = (observe.powers ?? []).map((name) => quantity(powerOf(branchOf(name))));
  const all = [...pairs, ...currents, ...powers];
  integrator.onStage = (stage) => {
    for (const one of all) one.atStage[stage] = one.value();
  };
  const width = window.to - window.from;
  const gathered = ({ sum, squares, peak }: Quantity): Gathered => ({
    mean: sum / width,
    rms: Math.sqrt(Math.max(0, squares / width)),
    peak,
  });
  const byName = (names: readonly string[] | undefined, of: readonly Quantity[]) =>
    Object.fromEntries((names ?? []).map((name, at) => [name, gathered(of[at]!)]));
  return {
    watch: watchOver(all, window, tableau.quadrature),
    summary: () => ({
      pairs: pairs.map(gathered),
      currents: byName(observe.currents, currents),
      powers: byName(observe.powers, powers),
    }),
  };
}

function watchOver(
  all: readonly Quantity[],
  window: { from: number; to: number },
  weights: readonly number[],
): Watch {
  const meetPeak = (one: Quantity, value: number): void => {
    if (Math.abs(value) > Math.abs(one.peak)) one.peak = value;
  };
  return {
    onMoment: (time) => {
      const isInside = time >= window.from && time <= window.to;
      for (const one of all) {
        one.atStage[0] = one.value();
        if (isInside) meetPeak(one, one.atStage[0]);
      }
    },
    onStep: (base, offset, length) => {
      // the window's ends are breaks, so a step is wholly inside or outside
      const middle = base + offset - length / 2;
      const isInside = middle > window.from && middle < window.to;
      for (const one of all) {
        if (isInside) gather(one, length, weights);
        // what stands now, which is the last stage unless a junction turned and it was found anew
        const end = one.value();
        if (isInside) meetPeak(one, end);
        one.atStage[0] = end;
      }
    },
  };
}

function gather(one: Quantity, length: number, weights: readonly number[]): void {
  for (let stage = 0; stage < weights.length; stage += 1) {
    const value = one.atStage[stage]!;
    one.sum += length * weights[stage]! * value;
    one.squares += length * weights[stage]! * value * value;
  }
}
