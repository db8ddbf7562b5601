import type { Wave } from './circuit.ts';
import { exp } from '../elementary/exponential.ts';
import { sin } from '../elementary/sine.ts';

/**
 * The value of a source's wave (V or A) at a time (s), as SPICE defines them:
 *   sine:  offset before the delay with the phase's share, then
 *          offset + amplitude exp(-(t - delay) damping) sin(2 pi f (t - delay) + phase)
 *   pulse: low until the delay, linear rise, high for `width`, linear fall, low until the period.
 * `side` -1 or +1 chooses the limit from before or after where a rise or fall takes no time.
 * Source: ngspice manual, chapter on independent sources.
 */
export function waveValue(wave: Wave, time: number, side: -1 | 1 = 1): number {
  switch (wave.shape) {
    case 'dc':
      return wave.value;
    case 'sine': {
      const phase = (wave.phaseDegrees * Math.PI) / 180;
      const since = time - wave.delay;
      if (since <= 0) return wave.offset + wave.amplitude * sin(phase);
      const decay = wave.damping === 0 ? 1 : exp(-since * wave.damping);
      return (
        wave.offset + wave.amplitude * decay * sin(2 * Math.PI * wave.frequency * since + phase)
      );
    }
    case 'pulse':
      return pulseValue(wave, time, side);
  }
}

/** s within which a time is taken to be at a corner, and on the side of it that is asked for. */
export function cornerWidth(time: number): number {
  return 1e-12 * Math.abs(time) + 1e-18;
}

function pulseValue(wave: Extract<Wave, { shape: 'pulse' }>, time: number, side: -1 | 1): number {
  const { low, high, rise, fall, width, period } = wave;
  const nudge = side * cornerWidth(time);
  let since = time - wave.delay;
  if (since + nudge < 0) return low;
  if (period > 0) since -= period * Math.floor((since + nudge) / period);
  const at = since + nudge;
  if (at < rise) return low + ((high - low) * Math.max(0, since)) / rise;
  if (at < rise + width) return high;
  if (at < rise + width + fall)
    return high - ((high - low) * Math.max(0, since - rise - width)) / fall;
  return low;
}

/** Times strictly inside (from, to), s, at which the wave or its slope jumps. */
export function waveCorners(wave: Wave, from: number, to: number): number[] {
  if (wave.shape === 'dc') return [];
  if (wave.shape === 'sine') return wave.delay > from && wave.delay < to ? [wave.delay] : [];
  const corners = [0, wave.rise, wave.rise + wave.width, wave.rise + wave.width + wave.fall];
  const times: number[] = [];
  const first = wave.period > 0 ? Math.max(0, Math.floor((from - wave.delay) / wave.period)) : 0;
  for (let cycle = first; ; cycle += 1) {
    const start = wave.delay + cycle * wave.period;
    if (start >= to) break;
    times.push(
      ...corners.map((corner) => start + corner).filter((time) => time > from && time < to),
    );
    if (wave.period <= 0) break;
  }
  return times;
}

/** The longest step, s, that still follows the wave between its corners. */
export function waveStepLimit(wave: Wave): number {
  if (wave.shape === 'sine' && wave.frequency > 0) return 1 / (12 * wave.frequency);
  return Infinity;
}
