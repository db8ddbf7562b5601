import { evolverByEvent } from './catalogue.ts';
import type { WireEvent } from './event.ts';

/** One line of the bench log. */
export function describeEvent(event: WireEvent): string {
  const known = evolverByEvent.get(event.type);
  const data = known?.data.safeParse(event.data);
  return known && data?.success ? known.describe(data.data) : event.type;
}
