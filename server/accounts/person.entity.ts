import { Check, Column, Entity, PrimaryColumn, Unique } from 'typeorm';

/** E-mail addresses are kept in lower case, so the plain unique constraint tells all spellings apart. */
@Entity('person')
@Unique('person_email_key', ['email'])
@Check('person_email_lower', `"email" = lower("email")`)
export class PersonEntity {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'person_pkey' })
  id!: string;

  @Column({ type: 'varchar', length: 254 })
  email!: string;

  @Column({ type: 'varchar', length: 80 })
  name!: string;

  /** argon2id, in PHC notation */
  @Column({ type: 'varchar', length: 255, name: 'password_hash' })
  passwordHash!: string;

  @Column({ type: 'timestamptz', name: 'created_at' })
  createdAt!: Date;
}
