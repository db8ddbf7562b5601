import type { Glyph } from '../glyph.ts';
import { paintFan } from './paint-fan.ts';
import { paintTurntableMotor } from './paint-turntable-motor.ts';
import { paintVentFan } from './paint-vent-fan.ts';

/** Motors by what they turn; one that names nothing is a fan in its shroud. */
const motors: Readonly<Record<string, Glyph>> = {
  turntable: paintTurntableMotor,
  'vent-fan': paintVentFan,
};

export const motorGlyph: Glyph = (pen, part) => (motors[part.variant ?? ''] ?? paintFan)(pen, part);
