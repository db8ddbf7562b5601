/**
 * How one circuit at rest differs from another: what a fault does to the circuit of a bench.
 * At rest a capacitor carries nothing, an inductor is its series resistance and a coupling does
 * nothing, so a change is made of
 *   cut      branches that carry nothing any more,
 *   raised   branches that have gained a resistance in series,
 *   joined   resistances put between two nodes, old or new (0 Ohm is legal),
 *   junctions put between two nodes.
 * A resistance R that falls to R' is joined by the 1 / (1/R' - 1/R) beside it: taken as a loss in
 * series, 1e9 Ohm that falls to 20 mOhm would leave no digits.
 */
import type { DiodeModel, Element, NodeName } from './circuit.ts';

export interface CircuitChange {
  readonly cut: readonly string[];
  readonly raised: readonly { readonly name: string; /** Ohm */ readonly ohms: number }[];
  readonly joined: readonly Joined[];
  readonly junctions: readonly JoinedJunction[];
}

export interface Joined {
  readonly nodes: readonly [NodeName, NodeName];
  /** Ohm */ readonly ohms: number;
}

export interface JoinedJunction {
  readonly nodes: readonly [NodeName, NodeName];
  readonly model: DiodeModel;
}

interface Draft {
  cut: string[];
  raised: { name: string; ohms: number }[];
  joined: Joined[];
  junctions: JoinedJunction[];
}

/**
 * What turns `before` into `after`, elements matched by name. Null where a source or a switch comes,
 * goes or changes: such a circuit has to be solved from its beginning.
 */
export function changeAtRest(
  before: readonly Element[],
  after: readonly Element[],
): CircuitChange | null {
  if (before.length === after.length && before.every((was, at) => isSame(was, after[at]!)))
    return noChange;
  const draft: Draft = { cut: [], raised: [], joined: [], junctions: [] };
  const old = new Map(before.map((element) => [element.name, element]));
  for (const element of after) {
    const was = old.get(element.name);
    old.delete(element.name);
    if (was !== undefined && isSame(was, element)) continue;
    if (was !== undefined && changeInPlace(draft, was, element)) continue;
    if (was !== undefined && !takeOut(draft, was)) return null;
    if (!putIn(draft, element)) return null;
  }
  for (const gone of old.values()) if (!takeOut(draft, gone)) return null;
  return draft;
}

/** Both changes made; they must not touch the same element. */
export function bothChanges(first: CircuitChange, second: CircuitChange): CircuitChange {
  if (first === noChange) return second;
  if (second === noChange) return first;
  return {
    cut: [...first.cut, ...second.cut],
    raised: [...first.raised, ...second.raised],
    joined: [...first.joined, ...second.joined],
    junctions: [...first.junctions, ...second.junctions],
  };
}

export const noChange: CircuitChange = { cut: [], raised: [], joined: [], junctions: [] };

const onSameNodes = (p: Element, q: Element): boolean =>
  p.kind !== 'coupling' &&
  q.kind !== 'coupling' &&
  p.nodes[0] === q.nodes[0] &&
  p.nodes[1] === q.nodes[1];

/** Whether the two are one and the same at rest. */
function isSame(was: Element, is: Element): boolean {
  if (was === is) return true;
  if (was.name !== is.name) return false;
  if (was.kind === 'coupling' || is.kind === 'coupling') return was.kind === is.kind;
  if (!onSameNodes(was, is)) return false;
  if (was.kind === 'resistor' && is.kind === 'resistor') return was.resistance === is.resistance;
  if (was.kind === 'capacitor') return is.kind === 'capacitor';
  if (was.kind === 'inductor' && is.kind === 'inductor')
    return (was.seriesResistance ?? 0) === (is.seriesResistance ?? 0);
  if (was.kind === 'diode' && is.kind === 'diode') return isSameModel(was.model, is.model);
  return JSON.stringify(was) === JSON.stringify(is);
}

const isSameModel = (p: DiodeModel, q: DiodeModel): boolean =>
  p.saturationCurrent === q.saturationCurrent &&
  p.emission === q.emission &&
  p.seriesResistance === q.seriesResistance &&
  p.breakdownVoltage === q.breakdownVoltage &&
  p.breakdownCurrent === q.breakdownCurrent;

/** A resistor between the same nodes with another value. */
function changeInPlace(draft: Draft, was: Element, is: Element): boolean {
  if (was.kind !== 'resistor' || is.kind !== 'resistor' || !onSameNodes(was, is)) return false;
  const gained = is.resistance - was.resistance;
  if (gained > 0) draft.raised.push({ name: is.name, ohms: gained });
  else {
    const beside = 1 / (1 / is.resistance - 1 / was.resistance);
    draft.joined.push({ nodes: is.nodes, ohms: beside });
  }
  return true;
}

function takeOut(draft: Draft, element: Element): boolean {
  switch (element.kind) {
    case 'resistor':
    case 'inductor':
    case 'diode':
      draft.cut.push(element.name);
      return true;
    case 'capacitor':
    case 'coupling':
      return true;
    case 'voltage-source':
    case 'current-source':
    case 'switch':
      return false;
  }
}

function putIn(draft: Draft, element: Element): boolean {
  switch (element.kind) {
    case 'resistor':
      draft.joined.push({ nodes: element.nodes, ohms: element.resistance });
      return true;
    case 'inductor':
      draft.joined.push({ nodes: element.nodes, ohms: element.seriesResistance ?? 0 });
      return true;
    case 'diode':
      draft.junctions.push({ nodes: element.nodes, model: element.model });
      return true;
    case 'capacitor':
    case 'coupling':
      return true;
    case 'voltage-source':
    case 'current-source':
    case 'switch':
      return false;
  }
}
