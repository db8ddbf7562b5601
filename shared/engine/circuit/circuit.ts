/**
 * A circuit: a list of elements between named nodes; node `0` is ground.
 * SI units. Branch current is positive from the first node, through the element, to the second.
 */
export type NodeName = string;

export interface DiodeModel {
  /** IS, A */ saturationCurrent: number;
  /** N, the whole stack: n times the number of junctions in series */ emission: number;
  /** RS, Ohm */ seriesResistance: number;
  /** BV, V; absent: never breaks down */ breakdownVoltage?: number;
  /** IBV, A */ breakdownCurrent?: number;
}

export interface SwitchModel {
  /** VT, V */ threshold: number;
  /** VH, V */ hysteresis: number;
  /** RON, Ohm */ onResistance: number;
  /** ROFF, Ohm */ offResistance: number;
}

export type Wave =
  | { shape: 'dc'; value: number }
  | {
      shape: 'sine';
      offset: number;
      amplitude: number;
      frequency: number;
      delay: number;
      damping: number;
      phaseDegrees: number;
    }
  | {
      shape: 'pulse';
      low: number;
      high: number;
      delay: number;
      rise: number;
      fall: number;
      width: number;
      period: number;
    };

interface TwoTerminal {
  name: string;
  nodes: readonly [NodeName, NodeName];
}

interface Source extends TwoTerminal {
  wave: Wave;
  /** value before t = 0, when it differs from the wave's own (a deck's `DC v`) */ dc?: number;
  ac?: { magnitude: number; phaseDegrees: number };
}

export type Element =
  | (TwoTerminal & { kind: 'resistor'; resistance: number })
  | (TwoTerminal & { kind: 'capacitor'; capacitance: number; initialVoltage?: number })
  | (TwoTerminal & {
      kind: 'inductor';
      inductance: number;
      seriesResistance?: number;
      initialCurrent?: number;
    })
  | { kind: 'coupling'; name: string; inductors: readonly [string, string]; coefficient: number }
  | (Source & { kind: 'voltage-source' })
  | (Source & { kind: 'current-source' })
  | (TwoTerminal & { kind: 'diode'; model: DiodeModel })
  | (TwoTerminal & {
      kind: 'switch';
      control: readonly [NodeName, NodeName];
      model: SwitchModel;
      isInitiallyOn?: boolean;
    });

export interface Circuit {
  elements: readonly Element[];
}

/** What capacitors (V) and inductors (A) hold, by element name. Survives changes of the circuit around them. */
export interface Storage {
  voltages: Readonly<Record<string, number>>;
  currents: Readonly<Record<string, number>>;
}

export type EngineFailure =
  | { code: 'floating-node'; node: NodeName; message: string }
  | { code: 'voltage-loop'; element: string; message: string }
  | { code: 'bad-element'; element: string; message: string }
  | {
      code: 'not-converged';
      node: NodeName;
      iteration: number;
      residual: number;
      time?: number;
      message: string;
    };

export type Result<T, F = EngineFailure> = { ok: true; value: T } | { ok: false; failure: F };

export interface OperatingPoint {
  /** V by node, ground included as 0 */ voltages: Readonly<Record<NodeName, number>>;
  /** A by name, of every voltage source and inductor */ currents: Readonly<Record<string, number>>;
}
