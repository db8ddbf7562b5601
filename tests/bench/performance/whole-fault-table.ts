import { manual2000 } from '../../../shared/instruments/manual-2000.ts';
import { faultTable } from '../../../shared/reasoning/fault-table.ts';
import { singleFaults } from '../../../shared/reasoning/single-faults.ts';
import { lc28 } from '../../support/bench.ts';

export const drawnSeeds = Array.from({ length: 25 }, (_, at) => at + 1);

/** Every single fault of the 120 V oven at every line of its service data, in the ovens drawn from these seeds; how many readings that is. */
export const wholeFaultTable = (seeds: readonly number[]): number =>
  faultTable({
    definition: lc28,
    candidates: singleFaults(lc28).map((fault) => ({ faults: [fault], opened: [] })),
    lines: lc28.serviceData,
    seeds,
    meter: manual2000,
  }).counts.length;
