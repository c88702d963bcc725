import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Person } from './person.ts';
import { Survey } from './survey.ts';

/** A file made off the request thread. */
@Entity('export')
@Index('export_survey', ['survey_id'])
@Index('export_person', ['person_id'])
export class Export {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'export_pk' }) id!: string;
  @Column({ type: 'uuid' }) survey_id!: string;
  @Column({ type: 'text' }) kind!: 'survey-report' | 'room-tally';
  @Column({ type: 'uuid', nullable: true }) room_id!: string | null;
  @Column({ type: 'text' }) units!: 'SI' | 'US';
  @Column({ type: 'text' }) state!: 'waiting' | 'running' | 'ready' | 'failed' | 'stopped';
  @Column({ type: 'double precision' }) progress!: number;
  /** Name in the files store; null until the file is there. */
  @Column({ type: 'text', nullable: true }) file_key!: string | null;
  @Column({ type: 'text', nullable: true }) file_name!: string | null;
  @Column({ type: 'integer', nullable: true }) bytes!: number | null;
  @Column({ type: 'text', nullable: true }) problem!: string | null;
  @Column({ type: 'uuid' }) person_id!: string;
  @Column({ type: 'timestamptz' }) created_at!: Date;
  @Column({ type: 'timestamptz' }) updated_at!: Date;

  @ManyToOne(() => Survey, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'survey_id', foreignKeyConstraintName: 'export_survey_fk' })
  survey?: Survey;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'export_person_fk' })
  person?: Person;
}
