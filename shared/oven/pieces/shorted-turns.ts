import { square } from '../../engine/elementary/power.ts';
import type { Element } from '../../engine/circuit/circuit.ts';
import { resistance } from './resistance.ts';
import type { Winding } from './windings.ts';

export interface ShortedTurns {
  /** what is left of the winding */ left: Winding;
  /** the closed loop, to be wound on the same core; none: no turns shorted */ loop: Winding | null;
  /** the loop's own wire */ wire: Element[];
}

/**
 * Takes a fraction n of a winding's turns out of it as a closed loop on the same limb:
 * the winding keeps (1 - n) R and (1 - n)^2 L, the loop has n R (or `loopResistance` Ohm) and n^2 L.
 */
export function shortTurns(
  winding: Winding,
  fraction: number,
  loopResistance = fraction * winding.resistance,
): ShortedTurns {
  if (fraction === 0) return { left: winding, loop: null, wire: [] };
  const name = `${winding.name}-shorted`;
  return {
    left: {
      ...winding,
      inductance: winding.inductance * square(1 - fraction),
      resistance: winding.resistance * (1 - fraction),
    },
    loop: {
      name,
      nodes: [name, '0'],
      inductance: winding.inductance * square(fraction),
      resistance: 0,
      linkage: Math.min(winding.linkage, 0.95),
      limb: winding.limb,
    },
    wire: [resistance(`${name}-wire`, name, '0', loopResistance)],
  };
}
