/**
 * When a thermal cut-out opens and closes: a contact with the hysteresis of its disc, on what it lies on.
 *   open when T > opensAt; closed again when T < closesAt (a one-shot: never).
 * Temperatures: service sheets SM-5, SM-4, FACTS 8; what a cut-out lies on: its variant.
 */
import type { AppliedFault } from '../../oven/fault.ts';
import type { DrawnOven } from '../../oven/oven-state.ts';
import { cutOut } from '../../oven/parts/cut-out.ts';
import { readFaults } from '../../oven/pieces/read-faults.ts';
import { roomCelsius } from './magnetron-heat.ts';

/** °C of all that a cut-out can lie on. */
export interface Temperatures {
  magnetron: number;
  cavity: number;
  hood: number;
}

/** Share of the water's rise that the cavity's air follows: steam. Judgement. */
const fromWater = 0.9;
/** Share of the magnetron's rise that its air carries into the cavity. Judgement. */
const fromMagnetron = 0.2;

/** On the bench nobody cooks under a hood: it stays as warm as the workshop. */
export const temperaturesAround = (magnetron: number, waterRise: number): Temperatures => ({
  magnetron,
  cavity: roomCelsius + fromWater * waterRise + fromMagnetron * (magnetron - roomCelsius),
  hood: roomCelsius,
});

export interface CutOut {
  ref: string;
  on: keyof Temperatures;
  /** °C */ opensAt: number;
  /** °C; far below any room for a one-shot */ closesAt: number;
  /** welded: it moves for no heat */ isFixed: boolean;
}

/** The cut-outs of this oven as they are, faults and all. */
export function cutOutsOf(oven: DrawnOven, faults: readonly AppliedFault[]): CutOut[] {
  return oven.definition.parts.flatMap((part): CutOut[] => {
    if (part.kind !== 'cut-out') return [];
    const fault = readFaults(
      cutOut.faults,
      faults.filter(({ on }) => on === part.ref),
    );
    const { opensAt = Infinity, closesAt = -Infinity } = oven.values[part.ref] ?? {};
    const early = fault.has('weak') ? fault.value('weak', 'opensAt') : opensAt;
    return [
      {
        ref: part.ref,
        on: placeOf(part.variant),
        opensAt: early,
        // A disc that has lost its setting closes as much earlier as it opens.
        closesAt: closesAt > roomCelsius ? (closesAt * early) / opensAt : closesAt,
        isFixed: fault.has('welded') || fault.has('open'),
      },
    ];
  });
}

function placeOf(variant: string | undefined): keyof Temperatures {
  if (variant === 'cavity' || variant === 'hood') return variant;
  return 'magnetron';
}

/** The cut-outs that are open at these temperatures, when `open` were so before. */
export const openNow = (
  cutOuts: readonly CutOut[],
  open: readonly string[],
  at: Temperatures,
): string[] =>
  cutOuts
    .filter(({ ref, on, opensAt, closesAt, isFixed }) =>
      open.includes(ref) ? isFixed || at[on] >= closesAt : !isFixed && at[on] > opensAt,
    )
    .map(({ ref }) => ref);
