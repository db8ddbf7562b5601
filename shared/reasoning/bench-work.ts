import type { OvenDefinition, ServiceMeasurement } from '../oven/oven.ts';
import type { Position } from './position.ts';
import { positionOf } from './position.ts';

/** s of bench work: ENGINE section 7; pressing an actuator: judgement. */
const SECONDS = { probe: 4, lead: 15, spot: 10, press: 5 } as const;
/** Cord out, cover off, discharge through a resistor, prove dead with a proved meter. Judgement. */
export const MAKE_SAFE_SECONDS = 90;

/** Where hands, tips and leads are between measurements. */
export interface AtBench {
  readonly position: Position;
  readonly tips: readonly string[];
  readonly isMadeSafe: boolean;
}

export const atTheStart: AtBench = {
  position: { lifted: [], cleaned: [], pressed: [] },
  tips: [],
  isMadeSafe: false,
};

/** s to get from here to the measurement: leads lifted, others refitted, spots, actuators and tips. */
export function secondsTo({ position, tips }: AtBench, line: ServiceMeasurement): number {
  const to = positionOf(line);
  const moved = (from: readonly string[], into: readonly string[]): number =>
    from.filter((one) => !into.includes(one)).length +
    into.filter((one) => !from.includes(one)).length;
  const cleaned = to.cleaned.filter((spot) => !position.cleaned.includes(spot)).length;
  const placed = line.between.filter((target, at) => tips[at] !== target).length;
  return (
    SECONDS.lead * moved(position.lifted, to.lifted) +
    SECONDS.spot * cleaned +
    SECONDS.press * to.pressed.filter((part) => !position.pressed.includes(part)).length +
    SECONDS.probe * Math.max(1, placed)
  );
}

export const after = (from: AtBench, line: ServiceMeasurement): AtBench => ({
  ...from,
  position: {
    ...positionOf(line),
    cleaned: [...new Set([...from.position.cleaned, ...(line.clean ?? [])])],
  },
  tips: line.between,
});

/** Whether the measurement may be made now: what lies under the cover only after making safe. */
export const isSafe = (
  { parts }: OvenDefinition,
  { isMadeSafe }: AtBench,
  { between, lift }: ServiceMeasurement,
): boolean => {
  const isOutside = (target: string): boolean =>
    parts.some(({ ref, isOutside: outside }) => outside && target.startsWith(`${ref}.`));
  return isMadeSafe || (lift.length === 0 && between.every(isOutside));
};
