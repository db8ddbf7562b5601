import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { liftedEnds } from '../../../shared/oven/targets.ts';
import { benchClock } from '../../components/bench-clock.ts';
import { provedDead } from './proved-dead.ts';

export interface Chip {
  /** green: made safe; yellow: mind it; none: just so */ tone: 'safe' | 'caution' | 'plain';
  text: string;
}

/** What the trainee can know of the bench by looking, and what they have proved. */
export function chipsFor(
  definition: OvenDefinition,
  state: BenchState,
  events: readonly WireEvent[],
): Chip[] {
  const lifted = liftedEnds(state.oven);
  const labelled = lifted.filter((end) => state.labels[end] !== undefined).length;
  const many = (n: number, what: string): string => `${n} ${what}${n === 1 ? '' : 's'}`;
  const chips: (Chip | null)[] = [
    state.isCordIn ? { tone: 'caution', text: 'cord in' } : { tone: 'safe', text: 'cord out' },
    state.isCoverOn ? { tone: 'plain', text: 'cover on' } : { tone: 'caution', text: 'cover off' },
    state.oven.isDoorClosed ? null : { tone: 'plain', text: 'door open' },
    state.isCordIn && state.isDisplayLit !== null
      ? { tone: 'plain', text: state.isDisplayLit ? 'display lit' : 'display dark' }
      : null,
    state.runsByItself ? { tone: 'caution', text: 'runs by itself' } : null,
    ...provedDead(definition, events).map(({ part, atMs }): Chip => ({
      tone: 'safe',
      text: `${part} proved 0 V at ${benchClock(atMs)}`,
    })),
    lifted.length === 0
      ? null
      : {
          tone: labelled < lifted.length ? 'caution' : 'plain',
          text: `${many(lifted.length, 'lead')} lifted, ${labelled} labelled`,
        },
    state.oven.pressed.length === 0
      ? null
      : { tone: 'plain', text: `${state.oven.pressed.join(', ')} held by hand` },
    state.meter.isDestroyed ? { tone: 'caution', text: 'meter destroyed' } : null,
  ];
  return chips.filter((chip) => chip !== null);
}
