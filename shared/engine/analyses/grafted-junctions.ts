import type { Junction } from '../devices/diode-law.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Graft } from './graft.ts';
import type { GraftedSystem } from './grafted-system.ts';
import { addedJunctionVolts, differenceIn, solveGrafted } from './grafted-system.ts';
import { createJunctionNewton, type JunctionNewton } from './junction-newton.ts';
import type { JunctionPorts } from './junction-ports.ts';
import type { Machine } from './machine.ts';
import { EXACT } from './newton.ts';

/** What the meter asks of the changed circuit with its junctions straight. */
export interface StraightAnswer {
  readonly red: number;
  readonly black: number;
  /** the old circuit's answer to 1 A into the pair, and its w */ readonly pair: Float64Array;
  readonly w: Float64Array;
  /** A that straight junctions would let through */ readonly amps: number;
  /** Ohm, the meter's and the circuit's own */ readonly loop: number;
}

/** The junctions of a changed circuit: the machine's own that are not cut, then the added ones. */
export interface GraftedJunctions {
  readonly machine: Machine;
  readonly ports: JunctionPorts;
  readonly graft: Graft;
  system: GraftedSystem | undefined;
  /** by place: the machine's own, then those of added branches at `own` + the branch's place */
  readonly own: number;
  readonly places: number[];
  /** V across each with no meter, and with what straight junctions let through */
  readonly rest: number[];
  readonly straight: number[];
  /** places of those off their straight lines */ readonly active: number[];
  /** to 1 A of excess, while the change stands */ readonly answers: Map<number, Answer>;
  readonly newtons: Map<string, JunctionNewton>;
}

interface Answer {
  readonly input: Float64Array | null;
  readonly w: Float64Array;
}

export const createGraftedJunctions = (
  machine: Machine,
  ports: JunctionPorts,
  graft: Graft,
): GraftedJunctions => ({
  machine,
  ports,
  graft,
  system: undefined,
  own: machine.junctions.length,
  places: [],
  rest: [],
  straight: [],
  active: [],
  answers: new Map(),
  newtons: new Map(),
});

/** Takes up the change that the graft and `system` now hold; `open` is the unchanged circuit at rest. */
export function takeJunctions(
  these: GraftedJunctions,
  system: GraftedSystem,
  open: Float64Array,
  atRest: Float64Array,
): void {
  const { own, graft, places, rest, answers } = these;
  these.system = system;
  if (answers.size > 0) answers.clear();
  let count = 0;
  for (let place = 0; place < own + graft.branchCount; place += 1) {
    if (place < own ? isCut(these, place) : graft.junctions[place - own] === null) continue;
    places[count] = place;
    rest[count] = voltsAt(these, place, open, atRest);
    count += 1;
  }
  if (places.length > count) places.length = count;
}

/**
 * V that the junctions' departure from their straight lines adds across the pair while no meter
 * current changes: 0 where all stay on them; undefined where they do not settle.
 */
export function bendJunctions(these: GraftedJunctions, asked: StraightAnswer): number | undefined {
  const { places, rest, straight, active } = these;
  if (active.length > 0) active.length = 0;
  for (let at = 0; at < places.length; at += 1) {
    const volts = rest[at]! + asked.amps * voltsAt(these, places[at]!, asked.pair, asked.w);
    straight[at] = volts;
    if (isOff(these, places[at]!, volts)) active.push(places[at]!);
  }
  if (active.length === 0) return 0;
  for (;;) {
    const volts = settle(these, asked);
    if (volts !== 'again') return volts;
  }
}

const lawAt = ({ own, machine, graft }: GraftedJunctions, place: number): Junction =>
  place < own ? machine.junctions[place]! : graft.junctions[place - own]!;

function voltsAt(
  { own, machine, graft }: GraftedJunctions,
  place: number,
  input: Float64Array | null,
  w: Float64Array,
): number {
  if (place >= own) return addedJunctionVolts(graft, input, w, place - own);
  const { from, to, nodeCount, size } = machine.netlist;
  const { branch, seriesResistance } = machine.junctions[place]!;
  const across = differenceIn(graft, input, w, from[branch]!, to[branch]!);
  const current = differenceIn(graft, input, w, nodeCount + branch, size);
  return across - (seriesResistance * current) / REFERENCE;
}

function isCut({ machine, graft }: GraftedJunctions, place: number): boolean {
  const { branch } = machine.junctions[place]!;
  for (let r = 0; r < graft.raisedCount; r += 1)
    if (graft.raised[r] === branch && graft.gained[r] === Infinity) return true;
  return false;
}

function isOff(these: GraftedJunctions, place: number, volts: number): boolean {
  const { voltage, slope } = lawAt(these, place);
  return Math.abs(volts - voltage) >= EXACT * slope;
}

function answerOf(these: GraftedJunctions, place: number): Answer | undefined {
  const { own, machine, ports, graft, system, answers } = these;
  const known = answers.get(place);
  if (known !== undefined || system === undefined) return known;
  const input = place < own ? ports.responses[place]! : null;
  const w = new Float64Array(system.size);
  const at = place < own ? -1 : place - own;
  if (!solveGrafted(system, graft, machine.netlist.nodeCount, input, at, w)) return undefined;
  const made = { input, w };
  answers.set(place, made);
  return made;
}

/** Newton's method on the active junctions alone; added ones have laws of their own each time. */
function newtonFor(these: GraftedJunctions): JunctionNewton {
  const { own, active, newtons } = these;
  const isKept = active.every((place) => place < own);
  const key = active.join(' ');
  const known = isKept ? newtons.get(key) : undefined;
  if (known !== undefined) return known;
  const made = createJunctionNewton(active.map((place) => lawAt(these, place)));
  if (isKept) newtons.set(key, made);
  return made;
}

/** V across the pair from the active junctions' excesses; 'again' when more have become active. */
function settle(these: GraftedJunctions, asked: StraightAnswer): number | 'again' | undefined {
  const { graft, places, straight, active } = these;
  const { red, black, pair, w, loop } = asked;
  const count = active.length;
  const newton = newtonFor(these);
  const p = new Float64Array(count);
  const found: Answer[] = [];
  for (const place of active) {
    const answer = answerOf(these, place);
    if (answer === undefined) return undefined;
    p[found.length] = differenceIn(graft, answer.input, answer.w, red, black);
    found.push(answer);
  }
  const gain = (place: number, j: number): number =>
    voltsAt(these, place, found[j]!.input, found[j]!.w) -
    (voltsAt(these, place, pair, w) * p[j]!) / loop;
  for (let k = 0; k < count; k += 1) {
    newton.base[k] = straight[places.indexOf(active[k]!)]!;
    for (let j = 0; j < count; j += 1) newton.h[k * count + j] = gain(active[k]!, j);
  }
  if (!newton.solve()) return undefined;
  for (let at = 0; at < places.length; at += 1) {
    const place = places[at]!;
    if (active.includes(place)) continue;
    let volts = straight[at]!;
    for (let j = 0; j < count; j += 1) volts += gain(place, j) * newton.excess[j]!;
    if (isOff(these, place, volts)) active.push(place);
  }
  if (active.length > count) return 'again';
  let volts = 0;
  for (let j = 0; j < count; j += 1) volts += p[j]! * newton.excess[j]!;
  return volts;
}
