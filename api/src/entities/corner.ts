import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Storey } from './storey.ts';

@Entity('corner')
@Index('corner_storey', ['survey_id', 'storey_id'])
export class Corner {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'corner_pk' }) survey_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'corner_pk' }) id!: string;
  @Column({ type: 'uuid' }) storey_id!: string;
  @Column({ type: 'double precision' }) x_m!: number;
  @Column({ type: 'double precision' }) y_m!: number;
  @Column({ type: 'integer' }) version!: number;

  @ManyToOne(() => Storey, { onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'survey_id', referencedColumnName: 'survey_id', foreignKeyConstraintName: 'corner_storey_fk' },
    { name: 'storey_id', referencedColumnName: 'id', foreignKeyConstraintName: 'corner_storey_fk' },
  ])
  storey?: Storey;
}
