import {
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  Unique,
  type Relation,
} from 'typeorm';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import { PersonEntity } from '../accounts/person.entity.ts';
import { ScenarioEntity } from './scenario.entity.ts';

/** A published version. A trigger refuses every UPDATE. */
@Entity('scenario_version')
@Unique('scenario_version_key', ['scenarioId', 'version'])
export class ScenarioVersionEntity {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'scenario_version_pkey' })
  id!: string;

  @Column({ type: 'uuid', name: 'scenario_id' })
  scenarioId!: string;

  @ManyToOne(() => ScenarioEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'scenario_id', foreignKeyConstraintName: 'scenario_version_scenario_fkey' })
  scenario!: Relation<ScenarioEntity>;

  /** counts from 1 within the scenario */
  @Column({ type: 'integer' })
  version!: number;

  @Column({ type: 'jsonb' })
  content!: ScenarioContent;

  @Column({ type: 'timestamptz', name: 'published_at' })
  publishedAt!: Date;

  /** null: published by Coldbench itself at start */
  @Column({ type: 'uuid', name: 'published_by', nullable: true })
  publishedBy!: string | null;

  @ManyToOne(() => PersonEntity, { nullable: true, onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'published_by', foreignKeyConstraintName: 'scenario_version_person_fkey' })
  publisher!: Relation<PersonEntity> | null;
}
