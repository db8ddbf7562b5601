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
import { OrganisationEntity } from '../organisations/organisation.entity.ts';

@Entity('scenario')
@Unique('scenario_number_key', ['organisationId', 'number'])
@Unique('scenario_origin_key', ['organisationId', 'origin'])
export class ScenarioEntity {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'scenario_pkey' })
  id!: string;

  @Column({ type: 'uuid', name: 'organisation_id' })
  organisationId!: string;

  @ManyToOne(() => OrganisationEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'scenario_organisation_fkey' })
  organisation!: Relation<OrganisationEntity>;

  /** counts from 1 within the organisation */
  @Column({ type: 'integer' })
  number!: number;

  /** the file in scenarios/jobs it came from; null: written in the workshop */
  @Column({ type: 'varchar', length: 80, nullable: true })
  origin!: string | null;

  @Column({ type: 'jsonb' })
  draft!: ScenarioContent;

  @Column({ type: 'timestamptz', name: 'updated_at' })
  updatedAt!: Date;
}
