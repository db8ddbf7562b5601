import type { MeterDefinition } from '../instruments/meter.ts';
import { settingOf } from '../instruments/meters.ts';
import type { OvenDefinition, ServiceMeasurement } from '../oven/oven.ts';
import type { Weighed } from './candidates.ts';
import { weighedCandidates } from './candidates.ts';
import type { Measured } from './fault-table.ts';
import { faultTable } from './fault-table.ts';
import type { Knowledge } from './next-measurement.ts';
import type { Outcomes } from './outcomes.ts';
import { outcomesOf } from './outcomes.ts';

/** ENGINE section 7: ovens drawn within tolerance. */
const SEEDS = Array.from({ length: 25 }, (_, at) => 1000 + at);

/** An oven's candidates, and what every measurement can say of them. */
export interface Study {
  readonly weighed: readonly Weighed[];
  readonly priors: readonly number[];
  readonly knowledge: Knowledge;
  /** outcomes of further measurements, asked for beside the service data */
  readonly further: readonly Outcomes[];
}

/** Computes a study; the service data's lines that this meter has no setting for are left out. */
export function studyOf(
  definition: OvenDefinition,
  meter: MeterDefinition,
  further: readonly Measured[] = [],
  extra: readonly Weighed[] = [],
): Study {
  const weighed = [...weighedCandidates(definition), ...extra];
  const lines: ServiceMeasurement[] = definition.serviceData.flatMap((line) => {
    const setting = settingOn(meter, line.setting);
    return setting === null ? [] : [{ ...line, setting }];
  });
  const table = faultTable({
    definition,
    candidates: weighed.map(({ candidate }) => candidate),
    lines: [...lines, ...further],
    seeds: SEEDS,
    meter,
  });
  const outcomes = outcomesOf(table, meter);
  return {
    weighed,
    priors: weighed.map(({ prior }) => prior),
    knowledge: { definition, lines, outcomes: outcomes.slice(0, lines.length) },
    further: outcomes.slice(lines.length),
  };
}

/** The same range on another meter, or the least one above it: service data names the manual meter's. */
export function settingOn(meter: MeterDefinition, id: string): string | null {
  if (settingOf(meter, id)) return id;
  const asked = /^ohms-(\d+)([kM]?)$/.exec(id);
  if (!asked) return null;
  const ohms = (text: RegExpExecArray): number =>
    Number(text[1]) * ({ k: 1e3, M: 1e6 }[text[2] ?? ''] ?? 1);
  const wide = meter.settings
    .map(({ id: one }) => ({ one, match: /^ohms-(\d+)([kM]?)$/.exec(one) }))
    .filter(({ match }) => match !== null && ohms(match) >= ohms(asked));
  return wide[0]?.one ?? null;
}
