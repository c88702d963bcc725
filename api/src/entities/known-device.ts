import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Person } from './person.ts';

/** A browser from which a person has signed in before: it gets in while somebody else's guesses are held back. */
@Entity('known_device')
@Index('known_device_person', ['person_id'])
export class KnownDevice {
  @PrimaryColumn({ type: 'text', primaryKeyConstraintName: 'known_device_pk' }) token_hash!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'known_device_pk' }) person_id!: string;
  @Column({ type: 'timestamptz' }) last_used_at!: Date;

  @ManyToOne(() => Person, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'known_device_person_fk' })
  person?: Person;
}
