import {
  checkInterlocks,
  surveyLeakage,
  testFromPlug,
} from '../../../shared/bench/actions/safety-checks.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { doorPlaces } from '../../../shared/bench/safety/leakage.ts';
import { formatQuantity } from '../../../shared/engine/quantities/format-quantity.ts';

/** The last result of each check, as read from its instrument; whether that is good enough is the trainee's to say. */
export function checkWords(events: readonly WireEvent[]): { label: string; value: string }[] {
  const last = (type: string): unknown => events.findLast((event) => event.type === type)?.data;
  const survey = surveyLeakage.data.safeParse(last(surveyLeakage.event));
  const opening = checkInterlocks.data.safeParse(last(checkInterlocks.event));
  const plug = testFromPlug.data.safeParse(last(testFromPlug.event));
  return [
    ...(survey.success ? leakageWords(survey.data.readings) : []),
    ...(opening.success ? [{ label: 'Door chain', value: openingWords(opening.data) }] : []),
    ...(plug.success
      ? [
          { label: 'Earth', value: orOver(plug.data.earth, 'open') },
          { label: 'Insulation', value: `${orOver(plug.data.insulation, 'over 2 GΩ')} at 500 V` },
        ]
      : []),
  ];
}

function leakageWords(readings: Readonly<Record<string, number>>) {
  const places = doorPlaces.map((place) => `${place} ${(readings[place] ?? 0).toFixed(2)}`);
  return [{ label: 'Leakage', value: `${places.join(', ')} mW/cm²` }];
}

const openingWords = (data: ReturnType<typeof checkInterlocks.data.parse>): string =>
  checkInterlocks.describe(data).replace('door opened slowly while running, ', '');

const orOver = (ohms: number | null, over: string): string =>
  ohms === null ? over : formatQuantity(ohms, 'Ω');
