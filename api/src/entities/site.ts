import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Organisation } from './organisation.ts';

/** A place kept by one organisation and shared by role with people of any. */
@Entity('site')
@Index('site_organisation', ['organisation_id'])
export class Site {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'site_pk' }) id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'text' }) address!: string;
  @Column({ type: 'text' }) time_zone!: string;
  /** The keeper. */
  @Column({ type: 'uuid' }) organisation_id!: string;
  @Column({ type: 'integer' }) version!: number;
  @Column({ type: 'timestamptz' }) created_at!: Date;
  @Column({ type: 'timestamptz' }) updated_at!: Date;

  @ManyToOne(() => Organisation, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'site_organisation_fk' })
  organisation?: Organisation;
}
