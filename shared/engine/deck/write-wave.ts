import type { Wave } from '../circuit/circuit.ts';

/** `sin(…)` or `pulse(…)` of a wave that moves. */
export function writeWave(wave: Exclude<Wave, { shape: 'dc' }>): string {
  switch (wave.shape) {
    case 'sine': {
      const { offset, amplitude, frequency, delay, damping, phaseDegrees } = wave;
      return `sin(${offset} ${amplitude} ${frequency} ${delay} ${damping} ${phaseDegrees})`;
    }
    case 'pulse': {
      const { low, high, delay, rise, fall, width, period } = wave;
      return `pulse(${low} ${high} ${delay} ${rise} ${fall} ${width} ${period})`;
    }
  }
}
