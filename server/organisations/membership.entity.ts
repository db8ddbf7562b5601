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
import type { Role } from '../../shared/contracts/fields.ts';
import { PersonEntity } from '../accounts/person.entity.ts';
import { OrganisationEntity } from './organisation.entity.ts';

@Entity('membership')
@Check('membership_role', `"role" IN ('trainee', 'instructor', 'administrator')`)
@Index('membership_organisation', ['organisationId'])
export class MembershipEntity {
  @PrimaryColumn({ type: 'uuid', name: 'person_id', primaryKeyConstraintName: 'membership_pkey' })
  personId!: string;

  @PrimaryColumn({
    type: 'uuid',
    name: 'organisation_id',
    primaryKeyConstraintName: 'membership_pkey',
  })
  organisationId!: string;

  @ManyToOne(() => PersonEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'membership_person_fkey' })
  person!: Relation<PersonEntity>;

  @ManyToOne(() => OrganisationEntity, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'membership_organisation_fkey' })
  organisation!: Relation<OrganisationEntity>;

  @Column({ type: 'varchar', length: 16 })
  role!: Role;

  @Column({ type: 'timestamptz', name: 'joined_at' })
  joinedAt!: Date;
}
