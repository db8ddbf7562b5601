import { beforeAll, describe, expect, it } from 'vitest';
import { assess } from '../../shared/assessment/assess.ts';
import type { Debrief, SkillName } from '../../shared/assessment/debrief.ts';
import { handsOn, opened, recorded, setupWith } from '../support/bench.ts';
import { recordingOf } from '../support/recordings.ts';

const judged = (job: string): Debrief => {
  const { setup, events } = recordingOf(job);
  return assess(setup, recorded(events));
};

const skill = (debrief: Debrief, name: SkillName) => {
  const found = debrief.skills.find((one) => one.skill === name);
  if (!found) throw new Error(`no ${name}`);
  return found;
};

describe('a careful attempt', () => {
  let debrief: Debrief;
  beforeAll(() => {
    debrief = judged('loud-hum-no-heat');
  }, 60_000);

  it('is safe and finds the cause', () => {
    expect(debrief).toMatchObject({ isCauseFound: true, isSafe: true });
    expect(skill(debrief, 'make safe').score).toBe(100);
    expect(skill(debrief, 'reason').score).toBe(100);
  });

  it('points every gained mark at an event of the attempt', () => {
    const { events } = recordingOf('loud-hum-no-heat');
    const marks = debrief.skills.flatMap((one) => one.marks).filter((one) => one.points > 0);
    expect(marks.length).toBeGreaterThan(20);
    for (const { sequence } of marks) {
      expect(sequence).not.toBeNull();
      expect(events[sequence ?? -1]).toBeDefined();
    }
    const proved = skill(debrief, 'make safe').marks.find((one) =>
      one.why.includes('proved the capacitor'),
    );
    expect(events[proved?.sequence ?? 0]).toMatchObject({
      type: 'ReadingCaptured',
      data: { red: 'C1.1', black: 'C1.2', unit: 'V' },
    });
  });

  it('loses its one mark for a range too high', () => {
    const lost = skill(debrief, 'measure').marks.filter((one) => one.points === 0);
    expect(lost.map((one) => one.why)).toEqual([expect.stringContaining('range far too high')]);
  });
});

describe('an attempt that forgot the capacitor', () => {
  let debrief: Debrief;
  beforeAll(() => {
    debrief = judged('quiet-no-heat-open-bleeder');
  }, 60_000);

  it('is not safe, and says where', () => {
    expect(debrief.isSafe).toBe(false);
    const { score, marks } = skill(debrief, 'make safe');
    expect(score).toBe(0);
    const { events } = recordingOf('quiet-no-heat-open-bleeder');
    const hazard = marks.find((one) => one.points < 0);
    expect(events[hazard?.sequence ?? 0]?.type).toBe('HazardHappened');
  });

  it('names one cause of two', () => {
    expect(debrief.isCauseFound).toBe(false);
    expect(debrief.outcome).toContain('1 of 2 causes');
    expect(skill(debrief, 'reason').score).toBe(50);
  });
});

describe('what the rules look for', () => {
  it('is the order: the same discharge after the first touch earns nothing', () => {
    const late = opened(handsOn(setupWith([{ on: 'D1', fault: 'shorted' }])));
    late.does('LiftLead', { end: 'W27/b' });
    late.does('FitDischargeClip', { target: 'CH.2' });
    late.does('TouchDischargeTip', { target: 'C1.1' });
    late.does('GiveVerdict', { part: 'D1', verdict: 'faulty' });
    late.does('HandIn', {});
    const marks = skill(assess(late.setup, recorded(late.events())), 'make safe').marks;
    expect(marks.find((one) => one.why.includes('C1.1'))).toMatchObject({ points: 0 });
  });

  it('is the whole cause: the right part with the wrong fault earns half', () => {
    const hands = handsOn(setupWith([{ on: 'D1', fault: 'shorted' }]));
    hands.does('StateCause', { causes: [{ on: 'D1', fault: 'open' }] });
    hands.does('HandIn', {});
    const debrief = assess(hands.setup, recorded(hands.events()));
    expect(skill(debrief, 'reason').score).toBe(50);
    expect(debrief.isCauseFound).toBe(false);
  });

  it('is a sound oven left alone too', () => {
    const hands = handsOn(setupWith([]));
    hands.does('GiveVerdict', { part: 'D1', verdict: 'good' });
    hands.does('HandIn', {});
    expect(skill(assess(hands.setup, recorded(hands.events())), 'reason').score).toBe(100);
  });
});

describe('a lead put right and checked', () => {
  it('earns the repair, and each check that came after it', () => {
    const whole = opened(handsOn(setupWith([{ on: 'W8', fault: 'open-inside' }])));
    whole.does('RepairLead', { lead: 'W8' });
    whole.does('FitCover', {});
    whole.does('TestFromPlug', {});
    whole.does('PlugCord', {});
    whole.does('RunOven', { ordered: 30 }, 30);
    whole.does('SurveyLeakage', {}, 30);
    whole.does('CheckInterlocks', {}, 5);
    const judgedNow = skill(assess(whole.setup, recorded(whole.events())), 'repair and verify');
    expect(judgedNow).toMatchObject({ score: 100 });
    expect(judgedNow.marks.map(({ why }) => why)).toContain('You put W8 right.');
    const unchecked = opened(handsOn(setupWith([{ on: 'W8', fault: 'open-inside' }])));
    unchecked.does('RepairLead', { lead: 'W8' });
    const { marks } = skill(
      assess(unchecked.setup, recorded(unchecked.events())),
      'repair and verify',
    );
    expect(marks.filter(({ points }) => points === 0).map(({ why }) => why)).toEqual(
      expect.arrayContaining(['The door was not surveyed for leakage.']),
    );
  });
});
