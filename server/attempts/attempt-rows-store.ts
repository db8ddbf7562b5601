import type { EntityManager, SelectQueryBuilder } from 'typeorm';
import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import { AttemptEntity } from './attempt.entity.ts';
import type { AttemptLine, AttemptRecord, AttemptStatus } from './attempt.ts';
import { ownerOf } from './locked-attempt-store.ts';

interface LineRow {
  id: string;
  person: string | null;
  organisation: string | null;
  visitor: string | null;
  personName: string | null;
  scenario: string;
  number: number;
  version: number;
  isTrial: boolean;
  title: string;
  status: AttemptStatus;
  startedAt: Date;
  handedInAt: Date | null;
  benchMs: number;
  next: number;
  score: number | null;
  outcome: string | null;
}

interface RecordRow extends LineRow {
  seed: number;
  content: ScenarioContent;
  engineVersion: number;
  epoch: number;
  writer: string | null;
  debrief: Debrief | null;
}

const lineColumns: Readonly<Record<keyof LineRow, string>> = {
  id: 'attempt.id',
  person: 'attempt.personId',
  organisation: 'attempt.organisationId',
  visitor: 'attempt.visitorTokenHash',
  personName: 'person.name',
  scenario: 'attempt.scenarioId',
  number: 'scenario.number',
  version: 'COALESCE(version.version, 0)',
  isTrial: 'attempt.scenarioVersionId IS NULL',
  title: `attempt.content ->> 'title'`,
  status: 'attempt.status',
  startedAt: 'attempt.startedAt',
  handedInAt: 'attempt.handedInAt',
  benchMs: 'attempt.benchMs',
  next: 'attempt.nextSequence',
  score: `(attempt.debrief ->> 'score')::double precision`,
  outcome: `attempt.debrief ->> 'outcome'`,
};

const recordColumns: Readonly<Record<Exclude<keyof RecordRow, keyof LineRow>, string>> = {
  seed: 'attempt.seed',
  content: 'attempt.content',
  engineVersion: 'attempt.engineVersion',
  epoch: 'attempt.epoch',
  writer: 'attempt.writer',
  debrief: 'attempt.debrief',
};

/** Names the condition; ordering and joins are done. */
type Narrow = (query: SelectQueryBuilder<AttemptEntity>) => unknown;

function select(
  manager: EntityManager,
  columns: Readonly<Record<string, string>>,
  narrow: Narrow,
): SelectQueryBuilder<AttemptEntity> {
  const query = manager
    .createQueryBuilder(AttemptEntity, 'attempt')
    .leftJoin('attempt.person', 'person')
    .innerJoin('attempt.scenario', 'scenario')
    .leftJoin('attempt.scenarioVersion', 'version')
    .select([])
    .orderBy('attempt.startedAt', 'DESC')
    .addOrderBy('attempt.id');
  for (const [name, sql] of Object.entries(columns)) query.addSelect(sql, name);
  narrow(query);
  return query;
}

function lineOf(row: LineRow): AttemptLine {
  const { person: _person, organisation: _organisation, visitor: _visitor, ...line } = row;
  return { ...line, owner: ownerOf(row) };
}

/** Lines of a list, newest first. */
export async function attemptLines(manager: EntityManager, narrow: Narrow): Promise<AttemptLine[]> {
  const rows = await select(manager, lineColumns, narrow).getRawMany<LineRow>();
  return rows.map(lineOf);
}

/** Whole attempts without their events, newest first. */
export async function attemptRecords(
  manager: EntityManager,
  narrow: Narrow,
): Promise<AttemptRecord[]> {
  const columns = { ...lineColumns, ...recordColumns };
  const rows = await select(manager, columns, narrow).getRawMany<RecordRow>();
  return rows.map((row) => {
    const { seed, content, engineVersion, epoch, writer, debrief } = row;
    return { ...lineOf(row), seed, content, engineVersion, epoch, writer, debrief };
  });
}
