import {
  Check,
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import { PersonEntity } from '../accounts/person.entity.ts';
import { OrganisationEntity } from '../organisations/organisation.entity.ts';
import { ScenarioVersionEntity } from '../scenarios/scenario-version.entity.ts';
import { ScenarioEntity } from '../scenarios/scenario.entity.ts';
import type { AttemptStatus } from './attempt.ts';

/** One row per attempt: who, what, and the projection of its events. Belongs to a person in an organisation or to a visitor. */
@Entity('attempt')
@Check('attempt_status', `"status" IN ('on the bench', 'handed in')`)
@Check('attempt_handed_in', `("status" = 'handed in') = ("handed_in_at" IS NOT NULL)`)
@Check('attempt_owner', `("person_id" IS NULL) = ("visitor_token_hash" IS NOT NULL)`)
@Check('attempt_organisation', `("person_id" IS NULL) = ("organisation_id" IS NULL)`)
@Index('attempt_person', ['personId', 'startedAt'])
@Index('attempt_organisation_started', ['organisationId', 'startedAt'])
@Index('attempt_visitor', ['visitorTokenHash'])
@Index('attempt_scenario', ['scenarioId'])
export class AttemptEntity {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'attempt_pkey' })
  id!: string;

  @Column({ type: 'uuid', name: 'organisation_id', nullable: true })
  organisationId!: string | null;

  @ManyToOne(() => OrganisationEntity, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'attempt_organisation_fkey' })
  organisation!: Relation<OrganisationEntity> | null;

  @Column({ type: 'uuid', name: 'person_id', nullable: true })
  personId!: string | null;

  @ManyToOne(() => PersonEntity, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'attempt_person_fkey' })
  person!: Relation<PersonEntity> | null;

  @Column({ type: 'char', length: 64, name: 'visitor_token_hash', nullable: true })
  visitorTokenHash!: string | null;

  @Column({ type: 'uuid', name: 'scenario_id' })
  scenarioId!: string;

  @ManyToOne(() => ScenarioEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'scenario_id', foreignKeyConstraintName: 'attempt_scenario_fkey' })
  scenario!: Relation<ScenarioEntity>;

  /** null: a trial of a draft */
  @Column({ type: 'uuid', name: 'scenario_version_id', nullable: true })
  scenarioVersionId!: string | null;

  @ManyToOne(() => ScenarioVersionEntity, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({
    name: 'scenario_version_id',
    foreignKeyConstraintName: 'attempt_scenario_version_fkey',
  })
  scenarioVersion!: Relation<ScenarioVersionEntity> | null;

  /** draws the oven and the meter */
  @Column({ type: 'integer' })
  seed!: number;

  /** as it was when the attempt began */
  @Column({ type: 'jsonb' })
  content!: ScenarioContent;

  @Column({ type: 'integer', name: 'engine_version' })
  engineVersion!: number;

  /** raised by every take-over; what an older writer sends is refused */
  @Column({ type: 'integer', default: 0 })
  epoch!: number;

  @Column({ type: 'uuid', nullable: true })
  writer!: string | null;

  @Column({ type: 'integer', name: 'next_sequence' })
  nextSequence!: number;

  @Column({ type: 'double precision', name: 'bench_ms' })
  benchMs!: number;

  @Column({ type: 'varchar', length: 16 })
  status!: AttemptStatus;

  @Column({ type: 'timestamptz', name: 'started_at' })
  startedAt!: Date;

  @Column({ type: 'timestamptz', name: 'handed_in_at', nullable: true })
  handedInAt!: Date | null;

  @Column({ type: 'jsonb', nullable: true })
  debrief!: Debrief | null;
}
