import type { Outcomes } from './outcomes.ts';

/**
 * What all measurements together can tell apart: the group of each candidate, numbered from 0. Two
 * candidates are told apart when some measurement has no outcome that both can give.
 */
export function partition(outcomes: readonly Outcomes[], count: number): number[] {
  const signatures = Array.from({ length: count }, (_, c) =>
    outcomes.map(({ shares, classes }) =>
      Array.from({ length: classes }, (_, seen) => (shares[c * classes + seen]! > 0 ? 1 : 0)),
    ),
  );
  const group = Array.from({ length: count }, () => -1);
  let groups = 0;
  for (let c = 0; c < count; c += 1) {
    if (group[c]! >= 0) continue;
    group[c] = groups;
    // Not being told apart is passed on: the group is all that hangs together.
    const waiting = [c];
    for (let one = waiting.pop(); one !== undefined; one = waiting.pop())
      for (let other = 0; other < count; other += 1) {
        if (group[other]! >= 0 || isApart(signatures[one]!, signatures[other]!)) continue;
        group[other] = groups;
        waiting.push(other);
      }
    groups += 1;
  }
  return group;
}

const isApart = (p: readonly (readonly number[])[], q: readonly (readonly number[])[]): boolean =>
  p.some((classes, line) => !classes.some((may, seen) => may && q[line]![seen]));
