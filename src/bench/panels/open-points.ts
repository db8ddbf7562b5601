import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { withoutUndone } from '../../../shared/bench/undone.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { liftedEnds } from '../../../shared/oven/targets.ts';

export interface Point {
  id: string;
  /** what has to be so */ text: string;
  isDone: boolean;
  /** what is missing, in the trade's words; empty when done */ open: string;
}

/** What belongs done before a job sheet is handed in, from what the trainee did and can see. */
export function openPoints(
  definition: OvenDefinition,
  state: BenchState,
  events: readonly WireEvent[],
): Point[] {
  const { sheet } = state;
  const lifted = liftedEnds(state.oven);
  const faulty = Object.keys(sheet.verdicts).filter((part) => sheet.verdicts[part] === 'faulty');
  const unreplaced = faulty.filter((part) => !state.replaced.includes(part));
  const inUse = toolsOn(state);
  const tested = definition.parts.filter(({ ref }) => isJudged(sheet.verdicts[ref])).length;
  const isRun = isRunAfterRepair(withoutUndone(events));
  const written = sheet.report.repair.trim() !== '' && sheet.report.customer.trim() !== '';
  const point = (id: string, text: string, isDone: boolean, open: string): Point => ({
    id,
    text,
    isDone,
    open: isDone ? '' : open,
  });
  return [
    point('cause', 'Cause stated', sheet.causes.length > 0, 'No cause is stated.'),
    point('verdicts', 'Verdicts given', tested > 0, 'No part is judged good or faulty.'),
    point(
      'replaced',
      'Faulty part replaced',
      faulty.length > 0 && unreplaced.length === 0,
      faulty.length === 0
        ? 'No faulty part was replaced.'
        : `Judged faulty and still in the oven: ${unreplaced.join(', ')}.`,
    ),
    point('leads', 'Leads refitted', lifted.length === 0, `Still lifted: ${lifted.join(', ')}.`),
    point(
      'tools',
      'Tools off the oven',
      inUse.length === 0,
      `Still connected: ${inUse.join(', ')}.`,
    ),
    point('cover', 'Cover on', state.isCoverOn, 'The cover is off.'),
    point('run', 'Run after the repair', isRun, 'The oven was not run after the last repair.'),
    point(
      'report',
      'Report written',
      written,
      'The report does not say both what was done and what the customer is told.',
    ),
  ];
}

const isJudged = (verdict: string | undefined): boolean =>
  verdict === 'good' || verdict === 'faulty';

const toolsOn = ({ probes, discharge, battery }: BenchState): string[] =>
  [
    probes.red && 'red probe',
    probes.black && 'black probe',
    (discharge.clip ?? discharge.tip) && 'discharge lead',
    (battery.neg ?? battery.oneK) && 'battery',
  ].filter((tool): tool is string => Boolean(tool));

const repairs = ['PartReplaced', 'LeadRefitted', 'CoverRemoved'];

/** The last run came after the last change, whatever came before it. */
function isRunAfterRepair(events: readonly WireEvent[]): boolean {
  const run = events.findLastIndex(({ type }) => type === 'OvenRun');
  return run > events.findLastIndex(({ type }) => repairs.includes(type));
}
