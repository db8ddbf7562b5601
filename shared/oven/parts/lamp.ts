/**
 * Cavity lamp, or the lamp over a cooktop: a tungsten filament. R(cold) = 48 Ohm; alight about ten times that.
 * Source: ENGINE section 3; ratio x10 from textbook problems in FACTS section 7.
 */
import type { FaultKind } from '../fault.ts';
import { judgement } from '../fault.ts';
import type { PartKind } from '../part-kind.ts';
import { readFaults } from '../pieces/read-faults.ts';
import { BROKEN, FUSED, resistance } from '../pieces/resistance.ts';

const faults: FaultKind[] = [
  {
    id: 'open',
    name: 'filament open',
    description: 'The filament is broken.',
    weight: 8,
    source: judgement,
    look: 'The filament hangs loose and the glass is grey inside.',
  },
  {
    id: 'shorted',
    name: 'holder shorted',
    description: 'The contacts of the lamp holder touch.',
    weight: 1,
    source: judgement,
    look: 'The holder has melted on one side.',
  },
];

export const lamp: PartKind = {
  kind: 'lamp',
  name: 'lamp',
  variants: ['cavity', 'cooktop'],
  usual: 'cavity',
  terminals: () => [
    { id: '1', name: 'supply side' },
    { id: '2', name: 'neutral side' },
  ],
  values: {
    cold: {
      name: 'cold filament',
      unit: 'Ω',
      nominal: 48,
      tolerance: 0.08,
      source: 'ENGINE 3; hot V²/P divided by 10, FACTS 8',
    },
    hotRatio: {
      name: 'hot to cold',
      unit: '',
      nominal: 10,
      tolerance: 0.05,
      source: 'FACTS 7, textbook problems',
    },
  },
  faults,
  running: { isHot: true, powers: ['filament'] },
  circuit: ({ node, inner, value, faults: applied, isHot }) => {
    const fault = readFaults(faults, applied);
    const sound = value('cold') * (isHot ? value('hotRatio') : 1);
    const filament = fault.has('open') ? BROKEN : sound;
    const elements = [resistance(inner('filament'), node('1'), node('2'), filament)];
    if (fault.has('shorted'))
      elements.push(resistance(inner('short'), node('1'), node('2'), FUSED));
    return elements;
  },
};
