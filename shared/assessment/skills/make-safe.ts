import { hazardWords } from '../../bench/outcomes.ts';
import type { Hazard } from '../../bench/record.ts';
import type { Attempt, Moment, Skill } from '../moments.ts';
import { mark, ofType, result } from '../moments.ts';

/** Unplug, discharge each capacitor terminal, prove the meter, prove dead, prove the meter again; then touch (FACTS 9, cautions to score). */
export const makeSafe: Skill = {
  name: 'make safe',
  judge(attempt) {
    const touched = firstTouch(attempt);
    const isBefore = (moment: Moment | undefined): boolean =>
      moment !== undefined && (!touched || moment.event.sequence < touched.event.sequence);
    const steps = makeSafeSteps(attempt);
    const marks = steps.map(({ done, gained, missed, points }) =>
      done && isBefore(done)
        ? mark(points, gained, done)
        : mark(0, done ? `${missed} It came only after the first touch.` : missed, done ?? touched),
    );
    const hazards = ofType(attempt, 'HazardHappened').map((moment) => {
      const { kind } = moment.event.data as Hazard;
      return mark(-4, `Hazard: ${hazardWords[kind]}.`, moment);
    });
    return result(
      'make safe',
      [...marks, ...hazards],
      steps.reduce((sum, step) => sum + step.points, 0),
    );
  },
};

interface Step {
  done: Moment | undefined;
  points: number;
  gained: string;
  missed: string;
}

function makeSafeSteps(attempt: Attempt): Step[] {
  const capacitors = attempt.setup.oven.definition.parts
    .filter((part) => part.kind === 'hv-capacitor')
    .map((part) => part.ref);
  const terminals = capacitors.flatMap((ref) => [`${ref}.1`, `${ref}.2`]);
  const discharged = ofType(attempt, 'DischargeTipTouched', 'DischargeClipFitted');
  const pair = (moment: Moment): string[] =>
    [moment.after.discharge.clip, moment.after.discharge.tip].filter((one) => one !== null);
  const onto = (terminal: string): Moment | undefined =>
    discharged.find((moment) => pair(moment).length === 2 && pair(moment).includes(terminal));
  const proofs = provedDead(attempt, capacitors);
  const source = provedOnSource(attempt);
  return [
    {
      done: ofType(attempt, 'CordPulled')[0],
      points: 2,
      gained: 'You pulled the cord before you touched anything.',
      missed: 'Pull the cord first.',
    },
    ...terminals.map((terminal) => ({
      done: onto(terminal),
      points: 2,
      gained: `You discharged ${terminal} through the resistor.`,
      missed: `Discharge ${terminal} through the discharge lead before you touch.`,
    })),
    {
      done: source.find((moment) => isEarlier(moment, proofs[0])),
      points: 1,
      gained: 'You proved the meter on a known source first.',
      missed: 'Prove the meter on a known source before you trust its zero.',
    },
    {
      done: proofs[0],
      points: 3,
      gained: 'You proved the capacitor dead on DC volts.',
      missed: 'Prove the capacitor dead on DC volts before you touch.',
    },
    {
      done: source.find((moment) => proofs[0] && isEarlier(proofs[0], moment)),
      points: 1,
      gained: 'You proved the meter again after the dead reading.',
      missed: 'Prove the meter once more after the dead reading.',
    },
  ];
}

const isEarlier = (a: Moment, b: Moment | undefined): boolean =>
  b !== undefined && a.event.sequence < b.event.sequence;

/** A bare hand on metal inside: lifting, refitting, replacing. */
export const firstTouch = (attempt: Attempt): Moment | undefined =>
  ofType(attempt, 'LeadLifted', 'LeadRefitted', 'PartReplaced', 'BatteryClipped')[0];

const readings = (attempt: Attempt): Moment[] => ofType(attempt, 'ReadingTaken', 'ReadingCaptured');

const touches = (moment: Moment, refs: readonly string[]): boolean =>
  refs.some((ref) =>
    [moment.event.data['red'], moment.event.data['black']].some(
      (target) => typeof target === 'string' && target.startsWith(`${ref}.`),
    ),
  );

const isDcVolts = (moment: Moment): boolean =>
  String(moment.event.data['setting']).startsWith('dc-');

function provedDead(attempt: Attempt, capacitors: readonly string[]): Moment[] {
  return readings(attempt).filter((moment) => {
    const value = moment.event.data['value'];
    return (
      isDcVolts(moment) &&
      touches(moment, capacitors) &&
      typeof value === 'number' &&
      Math.abs(value) < 1
    );
  });
}

function provedOnSource(attempt: Attempt): Moment[] {
  return readings(attempt).filter((moment) => {
    const value = moment.event.data['value'];
    return (
      isDcVolts(moment) &&
      touches(moment, ['BAT']) &&
      typeof value === 'number' &&
      Math.abs(value) > 5
    );
  });
}
