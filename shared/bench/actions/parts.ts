import { z } from 'zod';
import { formatQuantity } from '../../engine/quantities/format-quantity.ts';
import { partRef, terminalRef } from '../../oven/oven.ts';
import { sparesOf, wrongSize } from '../../oven/spares.ts';
import { terminalsOf } from '../../oven/targets.ts';
import { accept, action, refuse } from '../action.ts';
import type { Bench } from '../action.ts';
import { touch } from '../hazards.ts';
import { insideRefusal } from '../reach.ts';

const onPart = z.strictObject({ part: partRef });
/** `size`, of parts that come in several, SI units; absent: the oven's own */
const fitted = z.strictObject({ part: partRef, size: z.number().positive().optional() });
const onTerminal = z.strictObject({ terminal: terminalRef });

export const inspectPart = action({
  command: 'InspectPart',
  event: 'PartInspected',
  input: onPart,
  data: onPart,
  decide: (bench, data) => {
    const part = partOf(bench, data.part);
    if (!part) return refuse('no-such-part', `There is no part ${data.part}.`);
    // The door is the chassis' own, and it is seen from outside.
    const isSeen = part.isOutside || part.kind === 'chassis';
    return isSeen ? accept(data) : (insideRefusal(bench) ?? accept(data));
  },
  evolve: (state, { part }) => ({
    ...state,
    inspected: state.inspected.includes(part) ? state.inspected : [...state.inspected, part],
  }),
  describe: ({ part }) => `${part} inspected`,
});

export const cleanSpot = action({
  command: 'CleanSpot',
  event: 'SpotCleaned',
  input: onTerminal,
  data: onTerminal,
  decide: (bench, data) => {
    const { setup, state } = bench;
    const terminal = terminalsOf(setup.oven.definition).find((one) => one.ref === data.terminal);
    if (!terminal?.kind.isVarnished) {
      return refuse('not-varnished', `${data.terminal} has no varnish to clean off.`);
    }
    if (state.oven.cleaned.includes(data.terminal)) {
      return refuse('clean-already', `${data.terminal} is bare metal already.`);
    }
    return insideRefusal(bench) ?? accept(data);
  },
  evolve: (state, { terminal }) => ({
    ...state,
    oven: { ...state.oven, cleaned: [...state.oven.cleaned, terminal] },
  }),
  describe: ({ terminal }) => `${terminal} cleaned to bare metal`,
});

/** A new part, of a size that may be the wrong one. Its connectors must be off first; a fuse only snaps into its holder. */
export const replacePart = action({
  command: 'ReplacePart',
  event: 'PartReplaced',
  input: fitted,
  data: fitted,
  decide: (bench, data) => {
    const { setup, state } = bench;
    const part = partOf(bench, data.part);
    if (!part || part.kind === 'chassis') {
      return refuse('no-such-part', `There is no spare for ${data.part}.`);
    }
    if (data.size !== undefined && !sparesOf(part)?.sizes.includes(data.size)) {
      return refuse('no-such-size', `There is no spare for ${data.part} of that size.`);
    }
    const inside = part.isOutside ? null : insideRefusal(bench);
    if (inside) return inside;
    if (state.isCordIn) return refuse('cord-is-in', 'The cord is in. Pull it first.');
    const seated = Object.entries(state.oven.leadEnds).filter(
      ([, seat]) => seat?.split('.')[0] === data.part,
    );
    if (part.kind !== 'fuse' && seated.length > 0) {
      const ends = seated.map(([end]) => end).join(', ');
      return refuse('leads-on', `Lift the leads of ${data.part} first: ${ends}.`);
    }
    const terminals = terminalsOf(setup.oven.definition)
      .filter((one) => one.part === data.part && !one.kind.isVarnished)
      .map((one) => one.ref);
    return accept(data, touch(setup, state, terminals));
  },
  evolve: (state, { part, size }, setup) => ({
    ...state,
    replaced: state.replaced.includes(part) ? state.replaced : [...state.replaced, part],
    storage: {
      voltages: withoutPart(state.storage.voltages, part),
      currents: withoutPart(state.storage.currents, part),
    },
    ...(state.warmth
      ? { warmth: { ...state.warmth, celsius: withoutPart(state.warmth.celsius, part) } }
      : {}),
    oven: {
      ...state.oven,
      faults: [
        ...state.oven.faults.filter((fault) => fault.on !== part),
        ...wrongSize(setup.oven.definition, part, size),
      ],
      opened: state.oven.opened.filter((one) => one !== part),
      cleaned: state.oven.cleaned.filter((terminal) => terminal.split('.')[0] !== part),
    },
  }),
  // Capacitors and fuses are what comes in sizes, and no capacitor here reaches a millifarad.
  describe: ({ part, size }) =>
    size === undefined
      ? `${part} replaced`
      : `${part} replaced, ${formatQuantity(size, size < 1e-3 ? 'F' : 'A')}`,
});

const partOf = (bench: Bench, ref: string) =>
  bench.setup.oven.definition.parts.find((one) => one.ref === ref);

const withoutPart = (held: Readonly<Record<string, number>>, part: string) =>
  Object.fromEntries(Object.entries(held).filter(([name]) => name.split(':')[0] !== part));
