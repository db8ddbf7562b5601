import type { Attempt, AttemptSummary } from '../../shared/contracts/attempts.ts';
import type { Caller } from '../http/caller.ts';
import { isOwner } from './attempt-access.ts';
import type { AttemptLine, AttemptRecord } from './attempt.ts';

export const presentLine = (line: AttemptLine): AttemptSummary => ({
  id: line.id,
  scenario: line.scenario,
  version: line.version,
  title: line.title,
  person:
    line.owner.person === null ? null : { id: line.owner.person, name: line.personName ?? '' },
  status: line.status,
  isTrial: line.isTrial,
  startedAt: line.startedAt.toISOString(),
  handedInAt: line.handedInAt?.toISOString() ?? null,
  benchMs: line.benchMs,
  events: line.next,
  score: line.score,
  outcome: line.outcome,
});

export const presentAttempt = (record: AttemptRecord, caller: Caller): Attempt => ({
  ...presentLine(record),
  number: record.number,
  seed: record.seed,
  content: record.content,
  epoch: record.epoch,
  next: record.next,
  isOwn: record.status === 'on the bench' && isOwner(caller, record.owner),
});
