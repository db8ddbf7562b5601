import type { Circuit } from '../circuit/circuit.ts';

export interface TransientCommand {
  /** s */ step: number;
  /** s */ stop: number;
  /** s */ start?: number;
  /** s */ maxStep?: number;
  useInitialConditions: boolean;
}

/** A circuit in deck notation and what the deck asks of it. Names are in lower case. */
export interface Deck {
  title: string;
  circuit: Circuit;
  asksOperatingPoint: boolean;
  transient?: TransientCommand;
  /** Hz, when the deck has `.ac` */
  frequencies?: readonly number[];
  /** V by node, from `.ic` */
  initialVoltages: ReadonlyMap<string, number>;
  /** the line, counted from 1, on which each element stands */
  lineOf: ReadonlyMap<string, number>;
}

/** What is wrong with a deck; `line` counts from 1. */
export interface DeckError {
  line: number;
  message: string;
}
