import { Column, Entity, PrimaryColumn, Unique } from 'typeorm';

/** Someone who signs in. The address is stored in lower case. */
@Entity('person')
@Unique('person_email_unique', ['email'])
export class Person {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'person_pk' }) id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text' }) email!: string;
  /** PHC string of argon2id. */
  @Column({ type: 'text' }) password_hash!: string;
  @Column({ type: 'text' }) units!: 'SI' | 'US';
  @Column({ type: 'timestamptz' }) created_at!: Date;
}
