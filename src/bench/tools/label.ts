import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { Hand, Tool } from './tool.ts';

/** Lead labels: each tap tags a connector with the terminal it sits on now. */
export const label: Tool<Extract<Hand, { kind: 'label' }>> = {
  name: () => 'lead labels',
  hint: () => 'Tap a terminal: its lead gets a tag with the name of the terminal.',
  tap: (hand, target, state) => {
    const end = unlabelledEnd(target, state);
    if (end === undefined) return { command: null, hand };
    const text = state.oven.leadEnds[end] ?? end;
    return { command: { type: 'LabelLead', data: { end, text } }, hand };
  },
};

function unlabelledEnd(target: string, { oven, labels }: BenchState): string | undefined {
  const ends = Object.keys(oven.leadEnds).filter(
    (end) => end === target || oven.leadEnds[end] === target,
  );
  return ends.find((end) => labels[end] === undefined);
}
