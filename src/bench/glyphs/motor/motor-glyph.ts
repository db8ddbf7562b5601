import type { Glyph } from '../glyph.ts';
import { paintFan } from './paint-fan.ts';
import { paintTurntableMotor } from './paint-turntable-motor.ts';

/** A motor as what it turns: the fan in its shroud, or the geared motor under the turntable. */
export const motorGlyph: Glyph = (pen, part) =>
  part.variant === 'turntable' ? paintTurntableMotor(pen, part) : paintFan(pen, part);
