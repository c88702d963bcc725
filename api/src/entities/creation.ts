import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Person } from './person.ts';

/** That an id made by a client has been used, by whom and for what: a repeated creation gets the stored answer. */
@Entity('creation')
@Index('creation_person', ['person_id'])
export class Creation {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'creation_pk' }) id!: string;
  @Column({ type: 'uuid' }) person_id!: string;
  @Column({ type: 'text' }) body_hash!: string;
  @Column({ type: 'timestamptz' }) at!: Date;

  @ManyToOne(() => Person, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'creation_person_fk' })
  person?: Person;
}
