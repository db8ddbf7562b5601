import type { Wave } from './circuit.ts';
import { cornerWidth } from './wave-value.ts';
import { exp } from '../elementary/exponential.ts';
import { cos, sin } from '../elementary/sine.ts';

/** d/dt of a source's wave (V/s or A/s) at a time (s); at a corner, of the side asked for. */
export function waveSlope(wave: Wave, time: number, side: -1 | 1): number {
  switch (wave.shape) {
    case 'dc':
      return 0;
    case 'sine': {
      const since = time - wave.delay;
      if (since < 0 || (since === 0 && side < 0)) return 0;
      const omega = 2 * Math.PI * wave.frequency;
      const angle = omega * since + (wave.phaseDegrees * Math.PI) / 180;
      const turning = omega * cos(angle) - wave.damping * sin(angle);
      return wave.amplitude * exp(-since * wave.damping) * turning;
    }
    case 'pulse':
      return pulseSlope(wave, time, side);
  }
}

function pulseSlope(wave: Extract<Wave, { shape: 'pulse' }>, time: number, side: -1 | 1): number {
  const { low, high, rise, fall, width, period } = wave;
  // the same nudge off a corner as the wave's value takes
  let at = time - wave.delay + side * cornerWidth(time);
  if (at < 0) return 0;
  if (period > 0) at -= period * Math.floor(at / period);
  if (at < rise) return (high - low) / rise;
  if (at >= rise + width && at < rise + width + fall) return (low - high) / fall;
  return 0;
}
