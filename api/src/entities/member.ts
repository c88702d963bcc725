import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique } from 'typeorm';
import { Organisation } from './organisation.ts';
import { Person } from './person.ts';

/** A person in one organisation. */
@Entity('member')
@Unique('member_person_organisation_unique', ['person_id', 'organisation_id'])
@Index('member_organisation', ['organisation_id'])
export class Member {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'member_pk' }) id!: string;
  @Column({ type: 'uuid' }) person_id!: string;
  @Column({ type: 'uuid' }) organisation_id!: string;
  @Column({ type: 'text' }) role!: 'admin' | 'member';
  @Column({ type: 'timestamptz' }) created_at!: Date;

  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'member_person_fk' })
  person?: Person;
  @ManyToOne(() => Organisation, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'member_organisation_fk' })
  organisation?: Organisation;
}
