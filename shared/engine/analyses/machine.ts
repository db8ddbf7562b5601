import { badElement } from '../circuit/check.ts';
import type { Circuit, Element, EngineFailure, Result } from '../circuit/circuit.ts';
import { floatingNode, voltageLoop, type Regime } from '../circuit/loops-and-islands.ts';
import { buildNetlist, type Netlist } from '../circuit/netlist.ts';
import { mutualInductance } from '../devices/coupling.ts';
import { createJunction } from '../devices/diode.ts';
import type { Junction, JunctionLaw } from '../devices/diode-law.ts';
import type { SwitchState } from '../devices/switch.ts';
import { createFactors, type Factors } from '../linear/factors.ts';
import { cachedSymbolicLu } from '../linear/symbolic-cache.ts';
import { thermalVoltage } from '../quantities/physical-constants.ts';
import { createSystem, type System } from '../stamping/system.ts';
import { stampAtRest } from './stamp-at-rest.ts';
import { stampStage } from './stamp-stage.ts';

/** What the engine is told beside the circuit. */
export interface EngineOptions {
  /** S from every node to ground; 1e-12 unless told */ groundConductance?: number;
  /** V; that of 300 K unless told */ thermalVoltage?: number;
  /** 'shockley' unless told; 'spice' for comparison with such programs */ junctionLaw?: JunctionLaw;
}

/** Branches of one kind with the value the stamps read; values may change, the topology may not. */
export interface Valued {
  readonly branch: number;
  value: number;
}

export interface InductorValues extends Valued {
  resistance: number;
}

/** A source; `fixed` (V or A), once set, stands in for its wave in every analysis. */
export interface SourceState {
  readonly element: Source;
  /** of a voltage source; -1 for a current source */ readonly branch: number;
  fixed?: number;
}

export type Source = Extract<Element, { kind: 'voltage-source' | 'current-source' }>;

/** A circuit made ready for solving: its system, the parts that move, and the factors. */
export interface Machine {
  readonly circuit: Circuit;
  readonly netlist: Netlist;
  readonly system: System;
  readonly factors: Factors;
  readonly baseConductance: number;
  /** V below which a change is rounding: a flux of large size over a short stage has no more digits */
  voltageNoise: number;
  readonly sources: readonly SourceState[];
  readonly resistors: readonly Valued[];
  readonly capacitors: readonly Valued[];
  readonly inductors: readonly InductorValues[];
  /** H, by coupling, in the netlist's order */ readonly mutuals: Float64Array;
  readonly junctions: readonly Junction[];
  readonly switches: readonly SwitchState[];
  /** places in `inductors` of the two windings of each coupling */ readonly windings: Int32Array;
}

export const GROUND_CONDUCTANCE = 1e-12;

/** s; a middling stage, from which a circuit in motion takes its first order of pivots */
const TYPICAL_STAGE = 1e-6;

/**
 * Checks the circuit and makes it ready for analyses at rest or in motion. Fails with bad-element,
 * voltage-loop or floating-node.
 */
export function createMachine(
  circuit: Circuit,
  regime: Regime,
  options: EngineOptions = {},
): Result<Machine> {
  const fault =
    badElement(circuit) ?? voltageLoop(circuit, regime) ?? floatingNode(circuit, regime);
  if (fault !== undefined) return { ok: false, failure: fault };
  const netlist = buildNetlist(circuit);
  const baseConductance = options.groundConductance ?? GROUND_CONDUCTANCE;
  const system = createSystem(netlist, baseConductance);
  const parts = collectParts(netlist, options);
  stampAtRest(system, parts);
  if (regime === 'moving') stampStage(system, { netlist, ...parts }, TYPICAL_STAGE);
  const found = cachedSymbolicLu(system.pattern, system.values);
  if ('singularColumn' in found) {
    return { ok: false, failure: singular(netlist, found.singularColumn) };
  }
  const factors = createFactors(system.pattern, found.symbolic);
  return {
    ok: true,
    value: { circuit, netlist, system, factors, baseConductance, voltageNoise: 0, ...parts },
  };
}

/** The failure of a matrix that has no inverse, naming the unknown it broke at. */
export function singular(netlist: Netlist, column: number): EngineFailure {
  const node = netlist.nodeNames[column];
  if (node !== undefined) {
    return { code: 'floating-node', node, message: `nothing holds node ${node}` };
  }
  const element = netlist.branches[column - netlist.nodeCount]!.name;
  return { code: 'voltage-loop', element, message: `nothing sets the current of ${element}` };
}

type Parts = Pick<
  Machine,
  | 'sources'
  | 'resistors'
  | 'capacitors'
  | 'inductors'
  | 'mutuals'
  | 'junctions'
  | 'switches'
  | 'windings'
>;

function collectParts(netlist: Netlist, options: EngineOptions): Parts {
  const thermal = options.thermalVoltage ?? thermalVoltage();
  const law = options.junctionLaw ?? 'shockley';
  const sources: SourceState[] = netlist.currentSources.map((element) => ({ element, branch: -1 }));
  const resistors: Valued[] = [];
  const capacitors: Valued[] = [];
  const inductors: InductorValues[] = [];
  const junctions: Junction[] = [];
  const switches: SwitchState[] = [];
  netlist.branches.forEach((element, branch) => {
    switch (element.kind) {
      case 'resistor':
        resistors.push({ branch, value: element.resistance });
        break;
      case 'capacitor':
        capacitors.push({ branch, value: element.capacitance });
        break;
      case 'inductor': {
        const resistance = element.seriesResistance ?? 0;
        inductors.push({ branch, value: element.inductance, resistance });
        break;
      }
      case 'diode':
        junctions.push(createJunction(branch, element.model, thermal, law));
        break;
      case 'switch': {
        const [from, to] = element.control.map((node) => netlist.nodeIndex.get(node)!);
        switches.push({
          branch,
          controlFrom: from!,
          controlTo: to!,
          model: element.model,
          isOn: element.isInitiallyOn ?? false,
        });
        break;
      }
      case 'voltage-source':
        sources.push({ element, branch });
        break;
    }
  });
  const place = (branch: number) => inductors.findIndex((inductor) => inductor.branch === branch);
  const windings = netlist.coupled.flatMap(({ first, second }) => [place(first), place(second)]);
  const mutuals = netlist.coupled.map(({ coefficient }, c) => {
    const [first, second] = [inductors[windings[2 * c]!]!, inductors[windings[2 * c + 1]!]!];
    return mutualInductance(coefficient, first.value, second.value);
  });
  return {
    sources,
    resistors,
    capacitors,
    inductors,
    junctions,
    switches,
    mutuals: Float64Array.from(mutuals),
    windings: Int32Array.from(windings),
  };
}
