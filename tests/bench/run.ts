import { advance } from '../../shared/engine/analyses/advance.ts';
import { compile } from '../../shared/engine/analyses/compile.ts';
import { operatingPoint } from '../../shared/engine/analyses/operating-point.ts';
import { reduce } from '../../shared/engine/analyses/port-reduction.ts';
import { transient } from '../../shared/engine/analyses/transient.ts';
import type { Result } from '../../shared/engine/circuit/circuit.ts';
import { drainingCapacitor, highVoltageSide, ovenOnBench } from './performance/circuits.ts';
import { medianTime } from './performance/median-time.ts';
import { ngspiceTime, type NgspiceTime } from './performance/ngspice-time.ts';
import { onTwoThreads } from './performance/on-two-threads.ts';
import { drawnSeeds, wholeFaultTable } from './performance/whole-fault-table.ts';

/** V; what the doubler leaves on the capacitor at worst. */
const LEFT = 2969.85;
const OHMS = { openVolts: 3, sourceResistance: 2900 };

function must<T>(result: Result<T>): T {
  if (!result.ok) throw new Error(result.failure.message);
  return result.value;
}

interface Row {
  readonly what: string;
  readonly ours: { median: number; fastest: number };
  readonly theirs?: NgspiceTime;
  /** ms; what is asked for */ readonly target?: number;
}

const rows: Row[] = [];
const oven = ovenOnBench();
const compiled = must(compile(oven));
const { netlist } = compiled.machine;
const inductors = oven.elements.filter(({ kind }) => kind === 'inductor').length;
const sources = oven.elements.filter(({ kind }) => kind === 'voltage-source').length;
const unknowns = netlist.nodeCount + inductors + sources;

const theirPoint = ngspiceTime(oven, 'op', 200);
const lead = oven.elements.find(({ kind }) => kind === 'resistor')!.name;
rows.push({
  what: `operating point of the oven, ${unknowns} unknowns, compiled, one value changed`,
  ours: medianTime(2000, (turn) => {
    compiled.setValue(lead, 0.01 + 0.001 * (turn % 7));
    if (compiled.solve() !== undefined) throw new Error('the oven has no operating point');
  }),
  theirs: theirPoint,
  target: 0.15,
});
rows.push({
  what: 'the same from the circuit, nothing kept',
  ours: medianTime(200, () => must(operatingPoint(oven))),
  theirs: theirPoint,
});
rows.push({ what: 'reduction to ports', ours: medianTime(100, () => must(reduce(oven))) });

const solver = must(reduce(oven));
const nodes = netlist.nodeNames;
rows.push({
  what: 'next probe pair with a meter on it',
  ours: medianTime(5000, (turn) => {
    const red = nodes[(turn * 7) % nodes.length]!;
    const black = nodes[(turn * 13 + 5) % nodes.length]!;
    must(solver.probe(red, black, OHMS));
  }),
  theirs: theirPoint,
  target: 0.02,
});

const shared = await onTwoThreads(20);
rows.push({
  what: `fault table, ${shared.readings} readings, two threads`,
  ours: shared,
  target: 2000,
});
rows.push({
  what: 'the same on one thread',
  ours: medianTime(3, () => void wholeFaultTable(drawnSeeds)),
});

const powered = highVoltageSide();
rows.push({
  what: 'high-voltage side, 0.3 s of mains, means over the last 0.1 s',
  ours: medianTime(20, () => {
    const observe = { from: 0.2, pairs: [['x', '0'] as const], powers: ['v1'] };
    must(transient(powered, { stop: 0.3, useInitialConditions: true, observe }));
  }),
  theirs: ngspiceTime(powered, 'tran 20u 0.3 0 20u uic', 3),
  target: 300,
});

const observe = [['0', nodes[0]!] as const];
const capacitor = oven.elements.find(({ name }) => name.startsWith('C1') && name.endsWith('foils'));
const charged = { voltages: { [capacitor?.name ?? '']: LEFT }, currents: {} };
const settled = must(advance(oven, charged, 1)).storage;
const draining = drainingCapacitor(LEFT);
const pair = [['m', '0'] as const];
rows.push({
  what: 'waiting 5 minutes while 2970 V drains through bleeder and meter',
  ours: medianTime(20, () => {
    must(advance(draining, { voltages: {}, currents: {} }, 300, { observe: pair }));
  }),
  theirs: ngspiceTime(draining, 'tran 0.1 300 0 uic', 1),
});
rows.push({
  what: 'the same in the whole oven',
  ours: medianTime(20, () => must(advance(oven, settled, 300, { observe }))),
});
rows.push({
  what: 'waiting 5 minutes with nothing stored',
  ours: medianTime(20, () => must(advance(oven, { voltages: {}, currents: {} }, 300, { observe }))),
});
rows.push({
  what: 'the first second after 2970 V meets the oven',
  ours: medianTime(20, () => must(advance(oven, charged, 1, { observe }))),
});

const text = (ms: number): string =>
  ms < 1 ? `${(1000 * ms).toFixed(1)} us` : `${ms.toFixed(ms < 10 ? 2 : 1)} ms`;
const columns = ['ours, median', 'fastest', 'target', 'ngspice', 'its matrix', 'ngspice / ours'];
const lines = rows.map(({ what, ours, theirs, target }) => [
  what,
  text(ours.median),
  text(ours.fastest),
  target === undefined ? '' : text(target),
  theirs === undefined ? '' : text(theirs.whole),
  theirs === undefined ? '' : text(theirs.matrix),
  theirs === undefined ? '' : (theirs.whole / ours.median).toFixed(1),
]);
const all = [['', ...columns], ...lines];
const widths = all[0]!.map((_, at) => Math.max(...all.map((line) => line[at]!.length)));
for (const line of all) {
  console.log(
    line.map((cell, at) => (at ? cell.padStart : cell.padEnd).call(cell, widths[at]!)).join('  '),
  );
}
