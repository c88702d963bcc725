import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Storey } from './storey.ts';

@Entity('opening')
@Index('opening_storey', ['survey_id', 'storey_id'])
export class Opening {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'opening_pk' }) survey_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'opening_pk' }) id!: string;
  @Column({ type: 'uuid' }) storey_id!: string;
  /** The two corners of its wall. */
  @Column({ type: 'jsonb' }) wall!: unknown;
  @Column({ type: 'double precision' }) offset_m!: number;
  @Column({ type: 'double precision' }) width_m!: number;
  @Column({ type: 'double precision' }) height_m!: number;
  @Column({ type: 'double precision' }) sill_m!: number;
  @Column({ type: 'text' }) kind!: string;
  @Column({ type: 'text' }) state!: string;
  @Column({ type: 'text' }) label!: string;
  @Column({ type: 'integer' }) version!: number;

  @ManyToOne(() => Storey, { onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'survey_id', referencedColumnName: 'survey_id', foreignKeyConstraintName: 'opening_storey_fk' },
    { name: 'storey_id', referencedColumnName: 'id', foreignKeyConstraintName: 'opening_storey_fk' },
  ])
  storey?: Storey;
}
