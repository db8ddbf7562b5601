import type { BenchCommand } from '../../shared/bench/catalogue.ts';
import type { Step } from '../../shared/bench/perform.ts';

type DataOf<T extends BenchCommand['type']> = Extract<BenchCommand, { type: T }>['data'];

export const step = <T extends BenchCommand['type']>(
  seconds: number,
  type: T,
  data: DataOf<T>,
): Step => [seconds, { type, data } as BenchCommand];

export const runCold: Step = step(16, 'RunOven', { ordered: 10 });
export const pullCord: Step = step(5, 'PullCord', {});
export const removeCover: Step = step(14, 'RemoveCover', {});
export const openUp: Step[] = [runCold, pullCord, removeCover];

/** Each capacitor terminal to chassis through 20 kOhm, then terminal to terminal. */
export const discharge: Step[] = [
  step(9, 'FitDischargeClip', { target: 'CH.2' }),
  step(4, 'TouchDischargeTip', { target: 'C1.1' }),
  step(5, 'TouchDischargeTip', { target: 'C1.2' }),
  step(5, 'LiftDischargeTip', {}),
  step(4, 'FitDischargeClip', { target: 'C1.1' }),
  step(3, 'TouchDischargeTip', { target: 'C1.2' }),
  step(5, 'LiftDischargeTip', {}),
  step(2, 'RemoveDischargeClip', {}),
];

export const probe = (seconds: number, red: string, black: string): Step[] => [
  step(seconds, 'PlaceProbe', { probe: 'red', target: red }),
  step(2, 'PlaceProbe', { probe: 'black', target: black }),
];

const proveSource: Step[] = [...probe(4, 'BAT.pos', 'BAT.neg'), step(2, 'TakeReading', {})];

/** Prove, test, prove: known source, capacitor, known source. */
export const proveDead: Step[] = [
  step(3, 'SetMeter', { setting: 'dc-200' }),
  ...proveSource,
  ...probe(5, 'C1.1', 'C1.2'),
  step(2, 'CaptureReading', {}),
  ...probe(4, 'C1.2', 'CH.2'),
  step(2, 'CaptureReading', {}),
  ...proveSource,
];

export const lift = (end: string, label: string): Step[] => [
  step(6, 'LabelLead', { end, text: label }),
  step(5, 'LiftLead', { end }),
];

export const refit = (end: string, terminal: string): Step =>
  step(6, 'RefitLead', { end, terminal });

/** Zeroes the test leads on the setting, tips together. */
export const zero = (setting: string): Step[] => [
  step(3, 'SetMeter', { setting }),
  ...probe(3, 'CH.1', 'CH.1'),
  step(2, 'SetRelative', {}),
];

/** Probes a pair, waits for it to stand, writes it on the sheet. */
export const measure = (red: string, black: string, seconds = 2): Step[] => [
  ...probe(4, red, black),
  step(seconds, 'CaptureReading', {}),
];

export const setting = (id: string): Step => step(2, 'SetMeter', { setting: id });

export const verdict = (part: string, given: 'good' | 'faulty' | 'not tested'): Step =>
  step(3, 'GiveVerdict', { part, verdict: given });

export const cause = (...causes: { on: string; fault: string }[]): Step =>
  step(8, 'StateCause', { causes });

export const report = (repair: string, customer: string): Step =>
  step(40, 'WriteReport', { repair, customer });

export const inspect = (part: string): Step => step(5, 'InspectPart', { part });
export const replace = (part: string): Step => step(60, 'ReplacePart', { part });
export const repairLead = (lead: string): Step => step(240, 'RepairLead', { lead });
export const repairDoor: Step = step(900, 'RepairDoor', {});
export const probesOff: Step[] = [
  step(2, 'RemoveProbe', { probe: 'red' }),
  step(1, 'RemoveProbe', { probe: 'black' }),
];
export const runMinute: Step = step(65, 'RunOven', { ordered: 60 });
export const closeUp: Step[] = [step(12, 'FitCover', {}), step(4, 'PlugCord', {}), runMinute];
export const survey: Step = step(50, 'SurveyLeakage', {});
/** What belongs to every repair before the oven goes back: door surveyed, opened slowly, earth and insulation. */
export const finalChecks: Step[] = [
  survey,
  step(12, 'CheckInterlocks', {}),
  step(3, 'CloseDoor', {}),
  step(4, 'PullCord', {}),
  step(20, 'TestFromPlug', {}),
];
export const handIn: Step = step(10, 'HandIn', {});
export const openDoor: Step = step(4, 'OpenDoor', {});
export const closeDoor: Step = step(3, 'CloseDoor', {});
export const press = (part: string): Step => step(3, 'PressSwitch', { part });
export const letGo = (part: string): Step => step(2, 'ReleaseSwitch', { part });
export const clean = (terminal: string): Step => step(12, 'CleanSpot', { terminal });
