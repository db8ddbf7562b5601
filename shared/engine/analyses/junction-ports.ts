import { junctionVoltage } from '../devices/diode.ts';
import { switchOverdrive, type SwitchState } from '../devices/switch.ts';
import { solveFactored } from '../linear/factors.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/** The circuit seen from its junctions, at the operating point the machine holds factored. */
export interface JunctionPorts {
  /** V across each junction with no meter */ readonly open: Float64Array;
  /** V at junction k for 1 A of excess in junction j, at k * count + j */ readonly z: Float64Array;
  /** every unknown for 1 A of excess in each junction */ readonly responses: readonly Float64Array[];
  /** V at junction k in a solution `x` */ read(x: Float64Array, k: number): number;
  /** whether no switch turns when the meter drives `amps` with response `probe` */
  keepsSwitches(amps: number, probe: Float64Array, excess: Float64Array): boolean;
}

export function junctionPorts(machine: Machine): JunctionPorts {
  const { system, netlist, factors, junctions, switches } = machine;
  const { from, to, nodeCount, size } = netlist;
  const read = (x: Float64Array, k: number): number => {
    const { branch, seriesResistance } = junctions[k]!;
    const across = x[from[branch]!]! - x[to[branch]!]!;
    return across - (seriesResistance * x[nodeCount + branch]!) / REFERENCE;
  };
  const responses = junctions.map(({ branch, conductance, seriesResistance }) => {
    const response = new Float64Array(size + 1);
    const isResistive = conductance * REFERENCE > 1;
    response[nodeCount + branch] = isResistive
      ? -1 / conductance
      : -REFERENCE / (1 + conductance * seriesResistance);
    solveFactored(factors, response, response);
    response[size] = 0;
    return response;
  });
  const z = new Float64Array(junctions.length * junctions.length);
  responses.forEach((response, j) => {
    junctions.forEach((_, k) => (z[k * junctions.length + j] = read(response, k)));
  });
  const margins = switches.map((state) => switchOverdrive(system, state));
  return {
    open: Float64Array.from(junctions, (junction) => junctionVoltage(system, junction)),
    z,
    responses,
    read,
    keepsSwitches: (amps, probe, excess) =>
      switches.every((state, at) => {
        let moved = amps * controlIn(probe, state);
        responses.forEach((response, j) => (moved += excess[j]! * controlIn(response, state)));
        return margins[at]! + (state.isOn ? -moved : moved) <= 0;
      }),
  };
}

const controlIn = (x: Float64Array, { controlFrom, controlTo }: SwitchState): number =>
  x[controlFrom]! - x[controlTo]!;
