import { operatingPoint } from '../analyses/operating-point.ts';
import { phasor, type Complex } from '../analyses/phasor.ts';
import { transient } from '../analyses/transient.ts';
import type { Circuit, EngineFailure, Result } from '../circuit/circuit.ts';
import { floatingNode } from '../circuit/loops-and-islands.ts';
import type { Deck } from './deck.ts';
import { holdIslands } from './hold-islands.ts';

/** What a deck asked for. Keys are `v(node)` in V and `i(source)` in A, positive into its + node. */
export interface DeckAnswer {
  op?: Record<string, number>;
  /** also `time`, s */ tran?: Record<string, readonly number[]>;
  /** also `frequency`, Hz */ ac?: Record<string, readonly (number | Complex)[]>;
}

/**
 * k/q of CODATA 2014 (1.38064852e-23 / 1.6021766208e-19 V/K), which ngspice 39 was found to use, at
 * 300 K: 3.4e-7 below the exact one of the engine. Where a voltage stands across a bare junction
 * that alone would move its current by 8e-6.
 */
const OTHERS_THERMAL_VOLTAGE = (300 * 1.38064852e-23) / 1.6021766208e-19;

/**
 * S on every node, where other programs have none: 1e-7 of what 1 TOhm carries. With nothing at all
 * a node at the end of a lead carries only rounding, and Kirchhoff's law cannot be asserted of that.
 */
const NEXT_TO_NOTHING = 1e-19;

/** As the programs a deck is compared with have it. */
const LIKE_OTHERS = {
  junctionLaw: 'spice',
  groundConductance: NEXT_TO_NOTHING,
  thermalVoltage: OTHERS_THERMAL_VOLTAGE,
} as const;

/**
 * Error of one step: a diode that lets go of a winding rings at kilohertz, and after ten cycles the
 * engine's usual 1e-5 has grown to 1.3 % of the peak; this keeps it near 0.1 %.
 */
const RELATIVE_TOLERANCE = 3e-7;

/** Runs a deck's analyses. Fails as the first analysis that fails. */
export function solveDeck(deck: Deck): Result<DeckAnswer> {
  const circuit = holdIslands(deck.circuit);
  const answer: DeckAnswer = {};
  const startsFromRest =
    deck.asksOperatingPoint ||
    deck.frequencies !== undefined ||
    deck.transient?.useInitialConditions === false;
  const failure =
    // before the islands are held: a current into one would find its way through that
    (startsFromRest ? floatingNode(deck.circuit, 'steady') : undefined) ??
    (deck.asksOperatingPoint ? answerOp(circuit, answer) : undefined) ??
    answerTran(circuit, deck, answer) ??
    answerAc(circuit, deck, answer);
  return failure === undefined ? { ok: true, value: answer } : { ok: false, failure };
}

function answerOp(circuit: Circuit, answer: DeckAnswer): EngineFailure | undefined {
  const solved = operatingPoint(circuit, LIKE_OTHERS);
  if (!solved.ok) return solved.failure;
  answer.op = labelled(circuit, solved.value);
  return undefined;
}

function answerTran(circuit: Circuit, deck: Deck, answer: DeckAnswer): EngineFailure | undefined {
  if (deck.transient === undefined) return undefined;
  const initialVoltages = Object.fromEntries(deck.initialVoltages);
  const solved = transient(circuit, {
    ...LIKE_OTHERS,
    ...deck.transient,
    initialVoltages,
    relativeTolerance: RELATIVE_TOLERANCE,
  });
  if (!solved.ok) return solved.failure;
  answer.tran = { time: solved.value.time, ...labelled(circuit, solved.value) };
  return undefined;
}

function answerAc(circuit: Circuit, deck: Deck, answer: DeckAnswer): EngineFailure | undefined {
  if (deck.frequencies === undefined) return undefined;
  const solved = phasor(circuit, deck.frequencies, LIKE_OTHERS);
  if (!solved.ok) return solved.failure;
  answer.ac = { frequency: deck.frequencies, ...labelled(circuit, solved.value) };
  return undefined;
}

interface ByName<Value> {
  readonly voltages: Readonly<Record<string, Value>>;
  readonly currents: Readonly<Record<string, Value>>;
}

/** Every node but ground, and every voltage source. */
function labelled<Value>(
  { elements }: Circuit,
  { voltages, currents }: ByName<Value>,
): Record<string, Value> {
  const sources = elements.filter(({ kind }) => kind === 'voltage-source');
  return Object.fromEntries([
    ...Object.entries(voltages)
      .filter(([node]) => node !== '0')
      .map(([node, value]) => [`v(${node})`, value] as const),
    ...sources.flatMap(({ name }) => {
      const value = currents[name];
      return value === undefined ? [] : [[`i(${name})`, value] as const];
    }),
  ]);
}
