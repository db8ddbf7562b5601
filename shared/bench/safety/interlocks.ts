/**
 * The door of a running oven opened slowly: its hooks let go of one switch after the other, the
 * monitor switch last. At each the circuit says whether the high-voltage transformer is still fed,
 * and after the last whether a fuse has gone.
 * Order of the door chain and the monitor as its last branch: FACTS section 2 (letter of April 1980).
 */
import { phasor } from '../../engine/analyses/phasor.ts';
import { magnitude } from '../../engine/elementary/magnitude.ts';
import { asFitted } from '../../oven/initial-state.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { PartRef } from '../../oven/oven.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import { energisedCircuit } from '../powered-run/energised-circuit.ts';
import { fusesOf, fuseTime } from '../powered-run/fuse-time.ts';
import { refsOf } from '../powered-run/run-electrically.ts';

export interface DoorOpening {
  /** at which switch, counted from one, the transformer lost its supply; null: it never had it, or kept it */
  stoppedAt: number | null;
  /** how many switches feed it through the door */ switches: number;
  /** it was fed before the door moved */ wasRunning: boolean;
  /** fuses that melted when the monitor switch closed */ opened: PartRef[];
}

/** Of what a healthy oven takes; less is stray. Judgement. */
const fed = 0.05;
/** s in which a monitor circuit has done its work. Judgement. */
const atOnce = 0.5;

export function openSlowly(oven: DrawnOven, state: OvenState): DoorOpening {
  const all = refsOf(oven, 'door-switch');
  const monitors = all.filter((ref) => variantOf(oven, ref) === 'monitor');
  const chain = all.filter((ref) => !monitors.includes(ref));
  const order = [...chain, ...monitors];
  const running = started(oven, state);
  const healthy = feeding(oven, started(oven, asFitted(oven.definition, [])));
  const isFed = (released: number): boolean =>
    feeding(oven, {
      ...running,
      isDoorClosed: false,
      pressed: [...running.pressed, ...order.slice(released)],
    }) >
    fed * healthy;
  const wasRunning = feeding(oven, { ...running, isDoorClosed: true }) > fed * healthy;
  const first = chain.findIndex((_, at) => !isFed(at + 1));
  return {
    wasRunning,
    switches: chain.length,
    stoppedAt: wasRunning && first >= 0 ? first + 1 : null,
    opened: melted(oven, { ...running, isDoorClosed: false }),
  };
}

const variantOf = (oven: DrawnOven, ref: PartRef): string | undefined =>
  oven.definition.parts.find((part) => part.ref === ref)?.variant;

const started = (oven: DrawnOven, state: OvenState): OvenState => ({
  ...state,
  energised: oven.definition.parts
    .filter(({ kind }) => partKinds[kind].running?.isSwitchedOn)
    .map(({ ref }) => ref),
});

/** A rms by element, mains on; what conducts at high voltage only does not yet. */
function currentsIn(oven: DrawnOven, state: OvenState): (element: string) => number {
  const solved = phasor(energisedCircuit(oven, state), [oven.definition.supply.hertz]);
  if (!solved.ok) throw new Error(`interlocks: ${solved.failure.message}`);
  const { currents } = solved.value;
  return (element) => magnitude(...(currents[element]?.[0] ?? [0, 0]));
}

function feeding(oven: DrawnOven, state: OvenState): number {
  const current = currentsIn(oven, state);
  return refsOf(oven, 'hv-transformer').reduce((sum, ref) => sum + current(`${ref}:primary`), 0);
}

function melted(oven: DrawnOven, state: OvenState): PartRef[] {
  const current = currentsIn(oven, state);
  const ran = { current, power: () => 0, storage: { voltages: {}, currents: {} } };
  return fusesOf(oven).filter(
    (ref) => !state.opened.includes(ref) && fuseTime(oven, state, ref, ran) < atOnce,
  );
}
