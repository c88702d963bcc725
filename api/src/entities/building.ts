import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Site } from './site.ts';

@Entity('building')
@Index('building_site', ['site_id'])
export class Building {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'building_pk' }) id!: string;
  @Column({ type: 'uuid' }) site_id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'integer' }) version!: number;
  @Column({ type: 'timestamptz' }) created_at!: Date;
  @Column({ type: 'timestamptz' }) updated_at!: Date;

  @ManyToOne(() => Site, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'site_id', foreignKeyConstraintName: 'building_site_fk' })
  site?: Site;
}
