import type { WireEvent } from '../../../shared/bench/event.ts';
import { hazard, shownReading } from '../../../shared/bench/record.ts';
import type { BenchStore } from '../../simulation/bench-store.ts';
import { hazardWords } from '../panels/hazard-words.ts';
import { logLine } from '../panels/log-line.ts';
import { nameOfHand } from '../tools/catalogue.ts';

const units: Readonly<Record<string, string>> = {
  Ω: 'ohms',
  kΩ: 'kilohms',
  MΩ: 'megohms',
  V: 'volts',
  mV: 'millivolts',
  µF: 'microfarads',
  nF: 'nanofarads',
};

/** What to say about a change of the bench, in the order in which it should be heard. */
export function announcementsFor(before: BenchStore, now: BenchStore): string[] {
  return [
    ...noticeWords(before, now),
    ...eventWords(before, now),
    ...handWords(before, now),
    ...saveWords(before, now),
  ];
}

function noticeWords(before: BenchStore, { notice, state }: BenchStore): string[] {
  if (!notice || notice.id === before.notice?.id) return [];
  if (notice.kind === 'refusal') return [notice.text];
  const data = hazard.safeParse(notice.event.data);
  if (!data.success) return [];
  const { title, happened, person } = hazardWords(data.data);
  const offer = state.wayBack?.isOffered ? ' You can step back.' : '';
  return [`Hazard. ${title}. ${happened} ${person}${offer}`];
}

function eventWords(before: BenchStore, { events, setup }: BenchStore): string[] {
  if (events === before.events) return [];
  return events
    .slice(before.events.length)
    .filter(({ type }) => type !== 'HazardHappened')
    .map((event) => readingWords(event) ?? logLine(setup.meter, event));
}

/** A reading as it is read out; null: the event is none. */
function readingWords({ type, data }: WireEvent): string | null {
  if (type !== 'ReadingTaken' && type !== 'ReadingCaptured') return null;
  const parsed = shownReading.safeParse(data);
  if (!parsed.success) return null;
  const { display, unit, isBeeping } = parsed.data;
  const number = display === 'OL' ? 'over range' : `${display} ${units[unit] ?? unit}`;
  const written = type === 'ReadingCaptured' ? ', written on the job sheet' : '';
  return `${number}${isBeeping ? ', beeps' : ''}${written}`;
}

function handWords(before: BenchStore, { hand }: BenchStore): string[] {
  if (hand === before.hand || hand.kind === 'empty') return [];
  return [`${nameOfHand(hand)} in hand`];
}

function saveWords({ save: before }: BenchStore, { save }: BenchStore): string[] {
  if (save.kind === before.kind) return [];
  if (save.kind === 'waiting') return [`Not saved: kept on this device. ${save.why}`];
  if (save.kind === 'refused' || save.kind === 'read-only') return [save.why];
  return before.kind === 'waiting' && save.kind === 'saved' ? ['Saved again'] : [];
}
