import type { RunOutcome } from './record.ts';

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
      : [{ label: 'Display', value: displayWords(run.isDisplayLit, run) }]),
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
    ...comingAndGoing(run),
    ...hoodWords(run),
  ];
}

/** An oven that stopped before its time with the display lit has lost its supply. */
const displayWords = (isLit: boolean, { seconds, ordered }: RunOutcome): string => {
  if (!isLit) return 'dark';
  return seconds < ordered ? 'lit, then dark' : 'lit';
};

/** When the hum stopped and came back, as it is heard: which cut-out did it is for the trainee to find. */
function comingAndGoing({ heat, seconds }: RunOutcome): { label: string; value: string }[] {
  const heard = (heat?.moves ?? []).filter(({ after }) => after < seconds);
  const words = heard.map(
    ({ after, isOpen }) => `${isOpen ? 'stopped' : 'back'} after ${Math.round(after)} s`,
  );
  return words.length === 0 ? [] : [{ label: 'Heating', value: words.join(', ') }];
}

function hoodWords({ hood }: RunOutcome): { label: string; value: string }[] {
  if (!hood) return [];
  const speed = (isTurning: boolean): string => (isTurning ? 'turning' : 'still');
  const { isVentTurningLow, isVentTurningHigh, isLampLit } = hood;
  return [
    {
      label: 'Vent',
      value: `${speed(isVentTurningLow)} on low, ${speed(isVentTurningHigh)} on high`,
    },
    { label: 'Cooktop lamp', value: isLampLit ? 'lit' : 'dark' },
  ];
}

/**
 * The same in one line. Which fuse or cut-out opened is not among it: nobody sees that from in front
 * of the oven.
 */
export const runLine = (run: RunOutcome): string =>
  `run: ${[
    ...(run.isDisplayLit === undefined ? [] : [run.isDisplayLit ? 'display lit' : 'display dark']),
    ...(run.isTimerRunning === undefined ? [] : [`timer ${timer(run.isTimerRunning)}`]),
    run.isLampLit ? 'lamp lit' : 'lamp dark',
    sound(run),
    run.waterRise < 0.1 ? 'water cold' : `water up ${run.waterRise.toFixed(1)} K`,
    ...(run.seconds < run.ordered ? [`over after ${run.seconds.toFixed(1)} s`] : []),
    ...[...comingAndGoing(run), ...hoodWords(run)].map(
      ({ label, value }) => `${label.toLowerCase()} ${value}`,
    ),
  ].join(', ')}`;
