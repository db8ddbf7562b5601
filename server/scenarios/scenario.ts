import type { ScenarioContent } from '../../shared/scenario/scenario.ts';

export interface ScenarioRecord {
  id: string;
  number: number;
  draft: ScenarioContent;
  /** newest published version; null: never published */ published: number | null;
  hasUnpublishedChanges: boolean;
  updatedAt: Date;
}

export interface ScenarioLine extends ScenarioRecord {
  /** of the organisation, trials left out */ attempts: number;
}

/** The newest version of a published scenario: what a trainee starts. */
export interface PublishedScenario {
  scenario: string;
  number: number;
  versionId: string;
  version: number;
  content: ScenarioContent;
}

/** One trainee's past at one scenario, trials left out. */
export interface OwnResult {
  scenario: string;
  attempts: number;
  best: number | null;
}

export interface NewScenario {
  organisation: string;
  draft: ScenarioContent;
  /** file in scenarios/jobs; null: written in the workshop */ origin: string | null;
  at: Date;
}

export type Published =
  | { kind: 'published'; scenario: ScenarioRecord }
  | { kind: 'unchanged' }
  | { kind: 'refused'; mistakes: readonly { path: string; message: string }[] }
  | { kind: 'not-found' };

export interface PublishRequest {
  organisation: string;
  scenario: string;
  /** null: Coldbench itself */ by: string | null;
  at: Date;
  /** says what is wrong with the draft; it is asked while the draft cannot change */
  check: (draft: ScenarioContent) => readonly { path: string; message: string }[];
}

/** Where scenarios and their versions are kept. What is not the organisation's own is not found. */
export interface ScenarioStore {
  list: (organisation: string) => Promise<ScenarioLine[]>;
  find: (organisation: string, scenario: string) => Promise<ScenarioRecord | null>;
  findByOrigin: (organisation: string, origin: string) => Promise<ScenarioRecord | null>;
  create: (scenario: NewScenario) => Promise<ScenarioRecord>;
  saveDraft: (
    organisation: string,
    scenario: string,
    draft: ScenarioContent,
    at: Date,
  ) => Promise<ScenarioRecord | null>;
  publish: (request: PublishRequest) => Promise<Published>;
  /**
   * What the people of an organisation can start: its own published scenarios, then the practice
   * ones. Its own copy of a practice scenario stands in for that one.
   */
  listPublished: (organisation: string) => Promise<PublishedScenario[]>;
  findPublished: (organisation: string, scenario: string) => Promise<PublishedScenario | null>;
  /** in the order of their numbers */
  listPractice: () => Promise<PublishedScenario[]>;
  ownResults: (person: string, organisation: string) => Promise<OwnResult[]>;
}
