import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Organisation } from './organisation.ts';
import { Person } from './person.ts';

/** A file people sent. Its content is in the files store under `file_key` and never changes. */
@Entity('stored_file')
@Index('stored_file_organisation', ['organisation_id'])
@Index('stored_file_person', ['person_id'])
export class StoredFile {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'stored_file_pk' }) id!: string;
  @Column({ type: 'uuid' }) organisation_id!: string;
  @Column({ type: 'uuid' }) person_id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text' }) type!: string;
  @Column({ type: 'integer' }) bytes!: number;
  @Column({ type: 'text' }) sha256!: string;
  @Column({ type: 'text' }) file_key!: string;
  /** `arriving` until the store has it, `leaving` once the store is told to forget it. */
  @Column({ type: 'text' }) state!: 'arriving' | 'here' | 'leaving';
  @Column({ type: 'timestamptz' }) created_at!: Date;

  @ManyToOne(() => Organisation, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'stored_file_organisation_fk' })
  organisation?: Organisation;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'stored_file_person_fk' })
  person?: Person;
}
