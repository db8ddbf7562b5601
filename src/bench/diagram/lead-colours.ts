import type { OvenLead } from '../../../shared/oven/oven.ts';

type Insulation = OvenLead['insulation'];

/** Letters for the colours of insulation: after IEC 60757, from memory. */
export const colourCodes: Readonly<Record<Insulation, string>> = {
  black: 'BK',
  white: 'WH',
  blue: 'BU',
  brown: 'BN',
  red: 'RD',
  green: 'GN',
  'green-yellow': 'GNYE',
  yellow: 'YE',
  grey: 'GY',
  orange: 'OG',
};
