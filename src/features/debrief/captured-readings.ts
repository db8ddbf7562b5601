import { shownReading, type ShownReading } from '../../../shared/bench/record.ts';
import type { RecordedEvent } from '../../../shared/bench/event.ts';

export interface Captured {
  sequence: number;
  benchMs: number;
  reading: ShownReading;
}

/** The readings the trainee wrote on the job sheet, in order. */
export const capturedReadings = (events: readonly RecordedEvent[]): Captured[] =>
  events.flatMap(({ type, data, sequence, benchMs }) => {
    if (type !== 'ReadingCaptured') return [];
    const reading = shownReading.safeParse(data);
    return reading.success ? [{ sequence, benchMs, reading: reading.data }] : [];
  });
