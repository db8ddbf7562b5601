import {
  Column,
  Entity,
  Index,
  JoinColumn,
  ManyToOne,
  PrimaryColumn,
  type Relation,
} from 'typeorm';
import { OrganisationEntity } from '../organisations/organisation.entity.ts';
import { PersonEntity } from './person.entity.ts';

/** Lucia's table: it wants the columns id, user_id and expires_at. */
@Entity('session')
@Index('session_user', ['userId'])
@Index('session_expires_at', ['expiresAt'])
export class SessionEntity {
  /** SHA-256 of the session id, in hex: who reads the table cannot act as anybody */
  @PrimaryColumn({ type: 'char', length: 64, primaryKeyConstraintName: 'session_pkey' })
  id!: string;

  @Column({ type: 'uuid', name: 'user_id' })
  userId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'user_id', foreignKeyConstraintName: 'session_user_fkey' })
  user!: Relation<PersonEntity>;

  /** the organisation in which the person works in this session */
  @Column({ type: 'uuid', name: 'organisation_id' })
  organisationId!: string;

  @ManyToOne(() => OrganisationEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'session_organisation_fkey' })
  organisation!: Relation<OrganisationEntity>;

  @Column({ type: 'timestamptz', name: 'expires_at' })
  expiresAt!: Date;
}
