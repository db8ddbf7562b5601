import type { NodeName } from '../circuit/circuit.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';
import type { Watch } from './march.ts';

export interface GridSamples {
  time: number[];
  voltages: Record<NodeName, number[]>;
  currents: Record<string, number[]>;
}

/**
 * Keeps every node and every voltage source's and inductor's current at multiples of `step` from
 * `first`. `begin` takes what the machine holds as the sample at 0, in place of the moment after it.
 */
export function sampleGrid(
  machine: Machine,
  step: number,
  first: number,
): { samples: GridSamples; watch: Watch; begin(): void } {
  const { netlist, system } = machine;
  const samples: GridSamples = { time: [], voltages: { '0': [] }, currents: {} };
  if (step <= 0) {
    return { samples: { time: [], voltages: {}, currents: {} }, watch: {}, begin: () => undefined };
  }
  const kept: { values: number[]; at: number; unit: number }[] = [];
  netlist.nodeNames.forEach((name, node) => {
    samples.voltages[name] = [];
    kept.push({ values: samples.voltages[name], at: node, unit: 1 });
  });
  kept.push({ values: samples.voltages['0']!, at: netlist.size, unit: 1 });
  netlist.branches.forEach(({ kind, name }, k) => {
    if (kind !== 'voltage-source' && kind !== 'inductor') return;
    samples.currents[name] = [];
    kept.push({ values: samples.currents[name], at: netlist.nodeCount + k, unit: REFERENCE });
  });
  const put = (time: number): void => {
    if (time < first * (1 - 1e-9)) return;
    samples.time.push(time);
    for (const { values, at, unit } of kept) values.push(system.x[at]! / unit);
  };
  let lastIndex = -1;
  const begin = (): void => {
    lastIndex = 0;
    put(0);
  };
  const watch: Watch = {
    onMoment: (time) => {
      if (time === 0 && lastIndex < 0) begin();
    },
    onStep: (base, offset) => {
      const index = Math.round((base + offset) / step);
      const isOnGrid = Math.abs(base + offset - index * step) <= 1e-6 * step;
      if (!isOnGrid || index === lastIndex) return;
      lastIndex = index;
      put(index * step);
    },
  };
  return { samples, watch, begin };
}
