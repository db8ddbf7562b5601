import { readFileSync } from 'node:fs';
import type { SignedIn } from '../../shared/contracts/accounts.ts';
import type { Attempt, AttemptSummary } from '../../shared/contracts/attempts.ts';
import type { Role } from '../../shared/contracts/fields.ts';
import type { Job, Scenario, ScenarioSummary } from '../../shared/contracts/scenarios.ts';
import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import { scenarioContent, type ScenarioContent } from '../../shared/scenario/scenario.ts';
import { ovenLayout } from '../../shared/oven/layout.ts';
import { ovenDefinition } from '../../shared/oven/oven.ts';

/** From the project's folder, where every test runner starts. */
const fromFile = (path: string): unknown => JSON.parse(readFileSync(path, 'utf8'));

/** A uuid that can be told apart at sight: `id(7)` ends in 7. */
export const id = (n: number): string => `00000000-0000-4000-8000-${String(n).padStart(12, '0')}`;

const when = '2025-03-04T09:30:00.000Z';
const school = { id: id(900), name: 'Northgate Trade School' };
const workshop = { id: id(901), name: 'Hollin Road Workshop' };

export const signedInAs = (role: Role, others: readonly Role[] = []): SignedIn => ({
  person: { id: id(800), name: 'Tom Reyes', email: 'tom@northgate.example' },
  organisation: school,
  role,
  memberships: [
    { organisation: school, role },
    ...others.map((other) => ({ organisation: workshop, role: other })),
  ],
});

export const contents: readonly [ScenarioContent, ScenarioContent, ScenarioContent] = [
  scenarioContent.parse(fromFile('scenarios/jobs/loud-hum-no-heat.json')),
  scenarioContent.parse(fromFile('scenarios/jobs/quiet-no-heat-open-bleeder.json')),
  scenarioContent.parse(fromFile('scenarios/jobs/dead-no-display.json')),
];

const jobOf = (content: ScenarioContent, n: number, more: Partial<Job> = {}): Job => ({
  scenario: id(n),
  version: 1,
  number: 400 + n,
  title: content.title,
  oven: { id: content.oven, maker: 'Larkfield', model: 'LC-28', supply: '120 V 60 Hz, 15 A' },
  symptom: content.symptom,
  level: content.level,
  condition: content.condition,
  ticket: content.ticket,
  attempts: 0,
  best: null,
  ...more,
});

export const jobs: readonly [Job, Job, Job] = [
  jobOf(contents[0], 1, { attempts: 2, best: 71.5 }),
  jobOf(contents[1], 2),
  jobOf(contents[2], 3, { attempts: 1, best: 92 }),
];

export const summary = (n: number, more: Partial<AttemptSummary> = {}): AttemptSummary => ({
  id: id(100 + n),
  scenario: id(1),
  version: 1,
  title: contents[0].title,
  person: { id: id(800), name: 'Tom Reyes' },
  status: 'handed in',
  isTrial: false,
  startedAt: when,
  handedInAt: '2025-03-04T09:52:00.000Z',
  benchMs: 1_322_000,
  events: 10,
  score: 71.5,
  outcome: 'You found the shorted diode and left the capacitor unproved.',
  ...more,
});

export const attempt = (more: Partial<Attempt> = {}): Attempt => ({
  ...summary(1),
  number: 401,
  seed: 417,
  content: contents[0],
  epoch: 1,
  next: 10,
  isOwn: true,
  ...more,
});

const happened = (
  sequence: number,
  benchMs: number,
  type: string,
  data: Record<string, unknown>,
): RecordedEvent => ({ sequence, benchMs, type, data, version: 1, recordedAt: when });

const reading = (
  red: string,
  black: string,
  setting: string,
  display: string,
  value: number | null,
) => ({
  red,
  black,
  setting,
  display,
  unit: setting.startsWith('dc') ? 'V' : 'Ω',
  value,
  isSettled: true,
  isBeeping: false,
  isRelative: false,
});

export const events: readonly RecordedEvent[] = [
  happened(0, 0, 'AttemptBegan', {
    engine: 1,
    seed: 417,
    charge: {},
    opened: [],
    isDisplayLit: false,
  }),
  happened(1, 0, 'CordPulled', {}),
  happened(2, 14_000, 'CoverRemoved', {}),
  happened(3, 31_000, 'DischargeClipFitted', { target: 'CH.2' }),
  happened(4, 44_000, 'DischargeTipTouched', { target: 'C1.1' }),
  happened(5, 131_000, 'LeadLifted', { end: 'W23/a', from: 'T1.HV' }),
  happened(6, 160_000, 'MeterSet', { setting: 'ohms-200' }),
  happened(7, 182_000, 'ReadingCaptured', reading('T1.HV', 'T1.core', 'ohms-200', '94.8', 94.8)),
  happened(8, 244_000, 'ReadingCaptured', reading('D1.a', 'D1.k', 'ohms-200', '0.4', 0.4)),
  happened(9, 300_000, 'VerdictGiven', { part: 'D1', verdict: 'faulty' }),
];

export const debrief: Debrief = {
  outcome:
    'You found the shorted diode, but you touched the capacitor before you had proved it dead.',
  isCauseFound: true,
  isSafe: false,
  score: 71.5,
  faults: [{ on: 'D1', fault: 'shorted' }],
  skills: [
    {
      skill: 'make safe',
      score: 40,
      marks: [
        { points: 20, why: 'You pulled the cord before you took the cover off.', sequence: 1 },
        { points: 20, why: 'You discharged C1.1 through the discharge lead.', sequence: 4 },
        { points: -30, why: 'You never proved the capacitor dead on DC volts.', sequence: null },
      ],
    },
    {
      skill: 'isolate',
      score: 80,
      marks: [{ points: 20, why: 'You lifted W23 before you measured the winding.', sequence: 5 }],
    },
    {
      skill: 'measure',
      score: 90,
      marks: [
        { points: 15, why: 'You waited until the reading stood.', sequence: 7 },
        { points: 15, why: 'You waited until the reading stood.', sequence: 8 },
      ],
    },
    { skill: 'reason', score: 85, marks: [{ points: 25, why: 'You named D1.', sequence: 9 }] },
    { skill: 'repair and verify', score: null, marks: [] },
    {
      skill: 'record',
      score: 60,
      marks: [
        { points: -10, why: 'Your report does not say what the customer is told.', sequence: null },
      ],
    },
  ],
};

export const scenario = (more: Partial<Scenario> = {}): Scenario => ({
  id: id(1),
  number: 401,
  draft: contents[0],
  published: 2,
  hasUnpublishedChanges: false,
  updatedAt: when,
  ...more,
});

export const scenarioSummaries: readonly ScenarioSummary[] = contents.map((content, index) => ({
  id: id(index + 1),
  number: 401 + index,
  title: content.title,
  oven: 'Larkfield LC-28',
  symptom: content.symptom,
  level: content.level,
  published: index === 2 ? null : index + 1,
  hasUnpublishedChanges: index === 1,
  updatedAt: `2025-03-0${index + 1}T09:30:00.000Z`,
  attempts: 3 * index,
}));

export const oven = ovenDefinition.parse(fromFile('scenarios/ovens/larkfield-lc-28.json'));
export const layout = ovenLayout.parse(fromFile('scenarios/ovens/larkfield-lc-28.layout.json'));
