import type { ServiceMeasurement } from '../../../shared/oven/oven.ts';

/** What a good part gives, as the maker prints it: `80 – 120 Ω`, `< 1 Ω`, `open`, `beeps`. */
export function expectedText({ expect, low, high, unit }: ServiceMeasurement): string {
  switch (expect) {
    case 'open':
      return 'open';
    case 'beep':
      return 'beeps';
    case 'range':
      if (low !== undefined && high !== undefined) return `${low} – ${high} ${unit}`;
      if (high !== undefined) return `< ${high} ${unit}`;
      return low === undefined ? unit : `> ${low} ${unit}`;
  }
}
