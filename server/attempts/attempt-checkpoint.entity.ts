import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn, type Relation } from 'typeorm';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import { AttemptEntity } from './attempt.entity.ts';

const key = { primaryKeyConstraintName: 'attempt_checkpoint_pkey' };

/** The bench after the event of this sequence number, as one engine version folded it. A cache: it may be emptied at any time. */
@Entity('attempt_checkpoint')
export class AttemptCheckpointEntity {
  @PrimaryColumn({ type: 'uuid', name: 'attempt_id', ...key })
  attemptId!: string;

  @PrimaryColumn({ type: 'integer', ...key })
  sequence!: number;

  @PrimaryColumn({ type: 'integer', name: 'engine_version', ...key })
  engineVersion!: number;

  @ManyToOne(() => AttemptEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'attempt_id', foreignKeyConstraintName: 'attempt_checkpoint_attempt_fkey' })
  attempt!: Relation<AttemptEntity>;

  @Column({ type: 'jsonb' })
  state!: BenchState;
}
