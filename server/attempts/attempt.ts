import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent } from '../../shared/bench/event.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';

export type AttemptStatus = 'on the bench' | 'handed in';

/** Whose an attempt is: a person's in one organisation, or a browser's that visits. */
export type Owner =
  | { person: string; organisation: string; visitor: null }
  | { person: null; organisation: null; visitor: string };

/** What never changes while an attempt runs. */
export interface PinnedAttempt {
  id: string;
  seed: number;
  content: ScenarioContent;
  engineVersion: number;
}

/** What an append looks at and moves on. */
export interface AttemptState extends PinnedAttempt {
  owner: Owner;
  epoch: number;
  writer: string | null;
  /** the next sequence number */ next: number;
  benchMs: number;
  status: AttemptStatus;
  startedAt: Date;
}

/** One line of a list. */
export interface AttemptLine {
  id: string;
  owner: Owner;
  personName: string | null;
  scenario: string;
  number: number;
  /** 0: a trial of a draft */ version: number;
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

export interface AttemptRecord extends AttemptLine, AttemptState {
  debrief: Debrief | null;
}

export interface NewAttempt extends PinnedAttempt {
  owner: Owner;
  scenario: string;
  /** null: a trial */ scenarioVersion: string | null;
  startedAt: Date;
  first: RecordedEvent;
  state: BenchState;
}

export interface Checkpoint {
  /** of the last event folded into the state */ sequence: number;
  /** of the rules that folded it */ engineVersion: number;
  state: BenchState;
}

/** What an append leaves behind, all or nothing. */
export interface Advance {
  events: readonly RecordedEvent[];
  writer: string;
  benchMs: number;
  handedIn: { at: Date; debrief: Debrief } | null;
  checkpoint: Checkpoint | null;
}

/** An attempt nobody else can change until the work on it is over. */
export interface LockedAttempt {
  attempt: AttemptState;
  /** events from this sequence number on, in order */
  eventsFrom: (sequence: number) => Promise<RecordedEvent[]>;
  /** the newest that this version of the rules folded */
  newestCheckpoint: (
    engineVersion: number,
  ) => Promise<{ sequence: number; state: BenchState } | null>;
  advance: (advance: Advance) => Promise<void>;
  takeOver: (writer: string, epoch: number) => Promise<void>;
}

/** Where attempts are kept. Every answer of `withLocked` comes after its changes are safe. */
export interface AttemptStore {
  create: (attempt: NewAttempt) => Promise<AttemptRecord>;
  find: (id: string) => Promise<AttemptRecord | null>;
  eventsOf: (id: string) => Promise<RecordedEvent[]>;
  /** newest first, of every scenario or of one */
  listOwn: (person: string, organisation: string, scenario?: string) => Promise<AttemptLine[]>;
  /** newest first, without the trials of other people than the reader */
  listOfOrganisation: (organisation: string, reader: string) => Promise<AttemptLine[]>;
  /** the newest one still on the bench, trials left out */
  openOf: (owner: Owner, scenario: string | null) => Promise<AttemptRecord | null>;
  /** null: there is no such attempt */
  withLocked: <T>(id: string, work: (locked: LockedAttempt) => Promise<T>) => Promise<T | null>;
}
