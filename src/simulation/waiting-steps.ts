import type { WireEvent } from '../../shared/bench/event.ts';
import { isSameStep } from './is-same-step.ts';
import type { WaitingStep } from './outbox-store.ts';

export type Waiting =
  /** what the server does not have yet, first step `next` */
  | { kind: 'follow'; events: WireEvent[] }
  /** made on another history than the record's */
  | { kind: 'astray'; why: string };

/**
 * What of the steps kept on this device is still to be sent. A step that the record has already must
 * be the very same one: else the bench was continued elsewhere, and none of these follows from it.
 */
export function waitingSteps(record: readonly WireEvent[], kept: readonly WaitingStep[]): Waiting {
  const known = kept.filter(({ sequence }) => sequence < record.length);
  const rest = kept.filter(({ sequence }) => sequence >= record.length);
  if (known.some(({ sequence, event }) => !isSameStep(record[sequence], event))) {
    return {
      kind: 'astray',
      why: 'This job was continued on another device after these steps were made here.',
    };
  }
  if (rest.some(({ sequence }, i) => sequence !== record.length + i)) {
    return { kind: 'astray', why: 'Steps before these are missing on this device.' };
  }
  return { kind: 'follow', events: rest.map(({ event }) => event) };
}
