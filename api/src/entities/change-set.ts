import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique } from 'typeorm';
import { Person } from './person.ts';
import { Survey } from './survey.ts';

/** An accepted change set. These rows are the feed of a survey and the history of who changed what. */
@Entity('change_set')
@Unique('change_set_survey_sequence_unique', ['survey_id', 'sequence'])
@Index('change_set_person', ['person_id'])
export class ChangeSet {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'change_set_pk' }) id!: string;
  @Column({ type: 'uuid' }) survey_id!: string;
  @Column({ type: 'integer' }) sequence!: number;
  @Column({ type: 'text' }) label!: string;
  /** SHA-256 of the body as sent: the same id with another body is refused. */
  @Column({ type: 'text' }) body_hash!: string;
  /** The changes as applied after merging; `json` keeps them as written. */
  @Column({ type: 'json' }) changes!: unknown;
  @Column({ type: 'uuid' }) person_id!: string;
  @Column({ type: 'timestamptz' }) at!: Date;

  @ManyToOne(() => Survey, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'survey_id', foreignKeyConstraintName: 'change_set_survey_fk' })
  survey?: Survey;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'change_set_person_fk' })
  person?: Person;
}
