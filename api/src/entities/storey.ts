import { Column, Entity, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Survey } from './survey.ts';

@Entity('storey')
export class Storey {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'storey_pk' }) survey_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'storey_pk' }) id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'double precision' }) level_m!: number;
  @Column({ type: 'double precision' }) height_m!: number;
  @Column({ type: 'double precision' }) wall_thickness_m!: number;
  @Column({ type: 'jsonb', nullable: true }) plan_picture!: unknown;
  @Column({ type: 'double precision', nullable: true }) north_deg!: number | null;
  @Column({ type: 'integer' }) version!: number;

  @ManyToOne(() => Survey, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'survey_id', foreignKeyConstraintName: 'storey_survey_fk' })
  survey?: Survey;
}
