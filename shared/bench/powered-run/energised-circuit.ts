import type { Circuit, Element } from '../../engine/circuit/circuit.ts';
import { assemble } from '../../oven/assemble.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';

/** Ohm: outlet and house wiring behind it. Judgement. */
const outletOhms = 0.2;

/** The oven on its supply: V1 to neutral as a sine, neutral earthed at the supply. */
export function energisedCircuit(oven: DrawnOven, state: OvenState): Circuit {
  const { volts, hertz } = oven.definition.supply;
  const supply: Element[] = [
    {
      kind: 'voltage-source',
      name: 'mains',
      nodes: ['mains', 'P1.N'],
      wave: {
        shape: 'sine',
        offset: 0,
        amplitude: Math.SQRT2 * volts,
        frequency: hertz,
        delay: 0,
        damping: 0,
        phaseDegrees: 0,
      },
      ac: { magnitude: volts, phaseDegrees: 0 },
    },
    { kind: 'resistor', name: 'mains:loop', nodes: ['mains', 'P1.L'], resistance: outletOhms },
    { kind: 'resistor', name: 'mains:earth', nodes: ['P1.N', 'P1.E'], resistance: 0.1 },
  ];
  return { elements: [...assemble(oven, state, []).elements, ...supply] };
}
