import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Building } from './building.ts';

/** The document of a building. Its rows are written by change sets only, under the lock of this row. */
@Entity('survey')
@Index('survey_building', ['building_id'])
@Index('survey_one_working', ['building_id'], { unique: true, where: `"kind" = 'working'` })
export class Survey {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'survey_pk' }) id!: string;
  @Column({ type: 'uuid' }) building_id!: string;
  @Column({ type: 'text' }) kind!: 'working' | 'trial';
  /** The number of the last accepted change set. */
  @Column({ type: 'integer' }) sequence!: number;
  @Column({ type: 'timestamptz' }) created_at!: Date;
  @Column({ type: 'timestamptz' }) updated_at!: Date;

  @ManyToOne(() => Building, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'building_id', foreignKeyConstraintName: 'survey_building_fk' })
  building?: Building;
}
