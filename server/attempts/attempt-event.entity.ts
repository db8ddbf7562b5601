import {
  Check,
  Column,
  Entity,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { AttemptEntity } from './attempt.entity.ts';

/** What happened, for ever: a trigger refuses every UPDATE and DELETE. */
@Entity('attempt_event')
@Check('attempt_event_sequence', `"sequence" >= 0`)
export class AttemptEventEntity {
  @PrimaryColumn({
    type: 'uuid',
    name: 'attempt_id',
    primaryKeyConstraintName: 'attempt_event_pkey',
  })
  attemptId!: string;

  @PrimaryColumn({ type: 'integer', primaryKeyConstraintName: 'attempt_event_pkey' })
  sequence!: number;

  @ManyToOne(() => AttemptEntity, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'attempt_id', foreignKeyConstraintName: 'attempt_event_attempt_fkey' })
  attempt!: Relation<AttemptEntity>;

  @Column({ type: 'varchar', length: 41 })
  type!: string;

  @Column({ type: 'smallint' })
  version!: number;

  @Column({ type: 'jsonb' })
  data!: object;

  @Column({ type: 'double precision', name: 'bench_ms' })
  benchMs!: number;

  @Column({ type: 'timestamptz', name: 'recorded_at' })
  recordedAt!: Date;
}
