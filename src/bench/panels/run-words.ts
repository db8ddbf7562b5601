import type { RunOutcome } from '../../../shared/bench/record.ts';

const hums: Record<RunOutcome['hum'], string> = {
  none: 'no hum',
  quiet: 'a quiet hum',
  normal: 'the usual hum',
  loud: 'a loud hum',
};

const timer = (isRunning: boolean): string =>
  isRunning ? 'ticking, knob coming down' : 'knob stays where it is';

/** A fuse that opens on the way changes what is heard. */
const sound = ({ hum, atFirst }: RunOutcome): string =>
  atFirst
    ? `${hums[atFirst.hum]} for ${atFirst.seconds.toFixed(1)} s, then ${hums[hum]}`
    : hums[hum];

/** What a person in front of the oven saw, heard and measured in the water. */
export function runWords(run: RunOutcome): { label: string; value: string }[] {
  return [
    { label: 'Ran for', value: `${Number(run.seconds.toFixed(1))} s, 1000 g of water inside` },
    ...(run.isDisplayLit === undefined
      ? []
      : [{ label: 'Display', value: run.isDisplayLit ? 'lit' : 'dark' }]),
    ...(run.isTimerRunning === undefined
      ? []
      : [{ label: 'Timer', value: timer(run.isTimerRunning) }]),
    { label: 'Lamp', value: run.isLampLit ? 'lit' : 'dark' },
    { label: 'Fan', value: run.isFanTurning ? 'turning' : 'still' },
    { label: 'Turntable', value: run.isTurntableTurning ? 'turning' : 'still' },
    { label: 'Sound', value: sound(run) },
    {
      label: 'Water',
      value: run.waterRise < 0.1 ? 'stayed cold' : `${run.waterRise.toFixed(1)} K warmer`,
    },
  ];
}

/** The same in one line, for the bench log. */
export const runLine = (run: RunOutcome): string =>
  `run: ${[
    ...(run.isDisplayLit === undefined ? [] : [run.isDisplayLit ? 'display lit' : 'display dark']),
    ...(run.isTimerRunning === undefined ? [] : [`timer ${timer(run.isTimerRunning)}`]),
    run.isLampLit ? 'lamp lit' : 'lamp dark',
    sound(run),
    run.waterRise < 0.1 ? 'water cold' : `water up ${run.waterRise.toFixed(1)} K`,
  ].join(', ')}`;
