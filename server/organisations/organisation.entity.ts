import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

@Entity('organisation')
@Index('organisation_one_practice', ['isPractice'], { unique: true, where: 'is_practice' })
export class OrganisationEntity {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'organisation_pkey' })
  id!: string;

  @Column({ type: 'varchar', length: 120 })
  name!: string;

  /** the built-in organisation whose published scenarios everybody may practise on */
  @Column({ type: 'boolean', name: 'is_practice', default: false })
  isPractice!: boolean;

  @Column({ type: 'timestamptz', name: 'created_at' })
  createdAt!: Date;
}
