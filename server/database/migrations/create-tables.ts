import type { MigrationInterface, QueryRunner } from 'typeorm';

const people = [
  `CREATE TABLE "organisation" (
    "id" uuid NOT NULL,
    "name" character varying(120) NOT NULL,
    "is_practice" boolean NOT NULL DEFAULT false,
    "created_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    CONSTRAINT "organisation_pkey" PRIMARY KEY ("id")
  )`,
  `CREATE UNIQUE INDEX "organisation_one_practice" ON "organisation" ("is_practice") WHERE is_practice`,
  `CREATE TABLE "person" (
    "id" uuid NOT NULL,
    "email" character varying(254) NOT NULL,
    "name" character varying(80) NOT NULL,
    "password_hash" character varying(255) NOT NULL,
    "created_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    CONSTRAINT "person_pkey" PRIMARY KEY ("id"),
    CONSTRAINT "person_email_key" UNIQUE ("email"),
    CONSTRAINT "person_email_lower" CHECK ("email" = lower("email"))
  )`,
  `CREATE TABLE "membership" (
    "person_id" uuid NOT NULL,
    "organisation_id" uuid NOT NULL,
    "role" character varying(16) NOT NULL,
    "joined_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    CONSTRAINT "membership_pkey" PRIMARY KEY ("person_id", "organisation_id"),
    CONSTRAINT "membership_role" CHECK ("role" IN ('trainee', 'instructor', 'administrator')),
    CONSTRAINT "membership_person_fkey" FOREIGN KEY ("person_id")
      REFERENCES "person" ("id") ON DELETE CASCADE,
    CONSTRAINT "membership_organisation_fkey" FOREIGN KEY ("organisation_id")
      REFERENCES "organisation" ("id") ON DELETE CASCADE
  )`,
  `CREATE INDEX "membership_organisation" ON "membership" ("organisation_id")`,
  `CREATE TABLE "session" (
    "id" character(64) NOT NULL,
    "user_id" uuid NOT NULL,
    "organisation_id" uuid NOT NULL,
    "expires_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    CONSTRAINT "session_pkey" PRIMARY KEY ("id"),
    CONSTRAINT "session_user_fkey" FOREIGN KEY ("user_id")
      REFERENCES "person" ("id") ON DELETE CASCADE,
    CONSTRAINT "session_organisation_fkey" FOREIGN KEY ("organisation_id")
      REFERENCES "organisation" ("id") ON DELETE CASCADE
  )`,
  `CREATE INDEX "session_user" ON "session" ("user_id")`,
  `CREATE INDEX "session_expires_at" ON "session" ("expires_at")`,
];

const scenarios = [
  `CREATE TABLE "scenario" (
    "id" uuid NOT NULL,
    "organisation_id" uuid NOT NULL,
    "number" integer NOT NULL,
    "origin" character varying(80),
    "draft" jsonb NOT NULL,
    "updated_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    CONSTRAINT "scenario_pkey" PRIMARY KEY ("id"),
    CONSTRAINT "scenario_number_key" UNIQUE ("organisation_id", "number"),
    CONSTRAINT "scenario_origin_key" UNIQUE ("organisation_id", "origin"),
    CONSTRAINT "scenario_organisation_fkey" FOREIGN KEY ("organisation_id")
      REFERENCES "organisation" ("id") ON DELETE CASCADE
  )`,
  `CREATE TABLE "scenario_version" (
    "id" uuid NOT NULL,
    "scenario_id" uuid NOT NULL,
    "version" integer NOT NULL,
    "content" jsonb NOT NULL,
    "published_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    "published_by" uuid,
    CONSTRAINT "scenario_version_pkey" PRIMARY KEY ("id"),
    CONSTRAINT "scenario_version_key" UNIQUE ("scenario_id", "version"),
    CONSTRAINT "scenario_version_scenario_fkey" FOREIGN KEY ("scenario_id")
      REFERENCES "scenario" ("id") ON DELETE RESTRICT,
    CONSTRAINT "scenario_version_person_fkey" FOREIGN KEY ("published_by")
      REFERENCES "person" ("id") ON DELETE RESTRICT
  )`,
];

const attempts = [
  `CREATE TABLE "attempt" (
    "id" uuid NOT NULL,
    "organisation_id" uuid,
    "person_id" uuid,
    "visitor_token_hash" character(64),
    "scenario_id" uuid NOT NULL,
    "scenario_version_id" uuid,
    "seed" integer NOT NULL,
    "content" jsonb NOT NULL,
    "engine_version" integer NOT NULL,
    "epoch" integer NOT NULL DEFAULT 0,
    "writer" uuid,
    "next_sequence" integer NOT NULL,
    "bench_ms" double precision NOT NULL,
    "status" character varying(16) NOT NULL,
    "started_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    "handed_in_at" TIMESTAMP WITH TIME ZONE,
    "debrief" jsonb,
    CONSTRAINT "attempt_pkey" PRIMARY KEY ("id"),
    CONSTRAINT "attempt_status" CHECK ("status" IN ('on the bench', 'handed in')),
    CONSTRAINT "attempt_handed_in" CHECK (("status" = 'handed in') = ("handed_in_at" IS NOT NULL)),
    CONSTRAINT "attempt_owner" CHECK (("person_id" IS NULL) = ("visitor_token_hash" IS NOT NULL)),
    CONSTRAINT "attempt_organisation" CHECK (("person_id" IS NULL) = ("organisation_id" IS NULL)),
    CONSTRAINT "attempt_organisation_fkey" FOREIGN KEY ("organisation_id")
      REFERENCES "organisation" ("id") ON DELETE RESTRICT,
    CONSTRAINT "attempt_person_fkey" FOREIGN KEY ("person_id")
      REFERENCES "person" ("id") ON DELETE RESTRICT,
    CONSTRAINT "attempt_scenario_fkey" FOREIGN KEY ("scenario_id")
      REFERENCES "scenario" ("id") ON DELETE RESTRICT,
    CONSTRAINT "attempt_scenario_version_fkey" FOREIGN KEY ("scenario_version_id")
      REFERENCES "scenario_version" ("id") ON DELETE RESTRICT
  )`,
  `CREATE INDEX "attempt_person" ON "attempt" ("person_id", "started_at")`,
  `CREATE INDEX "attempt_organisation_started" ON "attempt" ("organisation_id", "started_at")`,
  `CREATE INDEX "attempt_visitor" ON "attempt" ("visitor_token_hash")`,
  `CREATE INDEX "attempt_scenario" ON "attempt" ("scenario_id")`,
  `CREATE TABLE "attempt_event" (
    "attempt_id" uuid NOT NULL,
    "sequence" integer NOT NULL,
    "type" character varying(41) NOT NULL,
    "version" smallint NOT NULL,
    "data" jsonb NOT NULL,
    "bench_ms" double precision NOT NULL,
    "recorded_at" TIMESTAMP WITH TIME ZONE NOT NULL,
    CONSTRAINT "attempt_event_pkey" PRIMARY KEY ("attempt_id", "sequence"),
    CONSTRAINT "attempt_event_sequence" CHECK ("sequence" >= 0),
    CONSTRAINT "attempt_event_attempt_fkey" FOREIGN KEY ("attempt_id")
      REFERENCES "attempt" ("id") ON DELETE RESTRICT
  )`,
  `CREATE TABLE "attempt_checkpoint" (
    "attempt_id" uuid NOT NULL,
    "sequence" integer NOT NULL,
    "engine_version" integer NOT NULL,
    "state" jsonb NOT NULL,
    CONSTRAINT "attempt_checkpoint_pkey" PRIMARY KEY ("attempt_id", "sequence", "engine_version"),
    CONSTRAINT "attempt_checkpoint_attempt_fkey" FOREIGN KEY ("attempt_id")
      REFERENCES "attempt" ("id") ON DELETE CASCADE
  )`,
];

/** What was recorded or published stays as it was, whatever a later program tries. */
const permanence = [
  `CREATE FUNCTION "refuse_change"() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    RAISE EXCEPTION 'rows of % are permanent', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
  END $$`,
  `CREATE TRIGGER "attempt_event_is_permanent" BEFORE UPDATE OR DELETE ON "attempt_event"
    FOR EACH ROW EXECUTE FUNCTION "refuse_change"()`,
  `CREATE TRIGGER "scenario_version_is_permanent" BEFORE UPDATE ON "scenario_version"
    FOR EACH ROW EXECUTE FUNCTION "refuse_change"()`,
];

const undo = [
  'attempt_checkpoint',
  'attempt_event',
  'attempt',
  'scenario_version',
  'scenario',
  'session',
  'membership',
  'person',
  'organisation',
].map((table) => `DROP TABLE "${table}"`);

export class CreateTables1790000000000 implements MigrationInterface {
  async up(runner: QueryRunner): Promise<void> {
    for (const sql of [...people, ...scenarios, ...attempts, ...permanence]) {
      await runner.query(sql);
    }
  }

  async down(runner: QueryRunner): Promise<void> {
    for (const sql of [...undo, `DROP FUNCTION "refuse_change"()`]) await runner.query(sql);
  }
}
