import type { TargetRef } from '../../../shared/oven/oven.ts';
import { isInBox } from './bench-box.ts';
import { distance, type BenchPoint } from './bench-point.ts';
import type { BenchScene, SceneLead } from './bench-scene.ts';
import { distanceToCurve } from './smooth-path.ts';

/** Reach on the screen, px: a fingertip finds a target from 24 px; nearer than 12 px a target beats a lead. */
export const reach = { target: 24, sure: 12, lead: 8 } as const;

export type BenchHit =
  | { kind: 'target'; target: TargetRef }
  | { kind: 'lead'; ref: string; nearEnd: 'a' | 'b' }
  | { kind: 'part'; ref: string };

const nearestTarget = (
  scene: BenchScene,
  at: BenchPoint,
  units: number,
): { target: TargetRef; away: number } | null => {
  let found: { target: TargetRef; away: number } | null = null;
  for (const terminal of scene.terminals) {
    if (!terminal.isReachable) continue;
    const away = distance(terminal.at, at);
    if (away <= units && (found === null || away < found.away))
      found = { target: terminal.target, away };
  }
  return found;
};

/** The nearest reachable target within 24 px of a bench point; zoom in px per unit. Null: none. */
export const hitTarget = (scene: BenchScene, at: BenchPoint, zoom: number): TargetRef | null =>
  nearestTarget(scene, at, reach.target / zoom)?.target ?? null;

/** The nearest lead within 8 px of a bench point; of two equally near, the one drawn on top. */
export const hitLead = (
  scene: BenchScene,
  at: BenchPoint,
  zoom: number,
): { ref: string; nearEnd: 'a' | 'b' } | null => {
  if (scene.isCoverOn) return null;
  let found: { lead: SceneLead; away: number } | null = null;
  for (const lead of scene.leads) {
    const away = distanceToCurve(at, lead.path, reach.lead / zoom);
    if (away < Infinity && (found === null || away <= found.away)) found = { lead, away };
  }
  if (found === null) return null;
  const [a, b] = found.lead.ends;
  return { ref: found.lead.ref, nearEnd: distance(at, a.at) <= distance(at, b.at) ? 'a' : 'b' };
};

/** The part drawn on top under a bench point, by its turned rectangle; the chassis is no part to pick. Null: none. */
export const hitPart = (scene: BenchScene, at: BenchPoint): string | null => {
  if (scene.isCoverOn) return null;
  for (const part of scene.parts.toReversed())
    if (part.kind !== 'chassis' && isInBox(unturned(at, part), part)) return part.ref;
  return null;
};

const unturned = (
  at: BenchPoint,
  part: { at: BenchPoint; size: BenchPoint; angle: number },
): BenchPoint => {
  const angle = (-part.angle * Math.PI) / 180;
  const middle: BenchPoint = [part.at[0] + part.size[0] / 2, part.at[1] + part.size[1] / 2];
  const [dx, dy] = [at[0] - middle[0], at[1] - middle[1]];
  return [
    middle[0] + dx * Math.cos(angle) - dy * Math.sin(angle),
    middle[1] + dx * Math.sin(angle) + dy * Math.cos(angle),
  ];
};

/**
 * What lies under a bench point: a target nearer than 12 px, else a lead, else a target within 24 px,
 * else a part. So a 24 px target is always whole, and a lead that passes near one can still be picked.
 */
export const hitTest = (scene: BenchScene, at: BenchPoint, zoom: number): BenchHit | null => {
  const target = nearestTarget(scene, at, reach.target / zoom);
  if (target !== null && target.away <= reach.sure / zoom)
    return { kind: 'target', target: target.target };
  const lead = hitLead(scene, at, zoom);
  if (lead !== null) return { kind: 'lead', ...lead };
  if (target !== null) return { kind: 'target', target: target.target };
  const part = hitPart(scene, at);
  return part === null ? null : { kind: 'part', ref: part };
};
