import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique } from 'typeorm';
import { Member } from './member.ts';
import { Site } from './site.ts';

/** The one role of a member on a site. */
@Entity('site_role')
@Unique('site_role_member_site_unique', ['member_id', 'site_id'])
@Index('site_role_site', ['site_id'])
export class SiteRole {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'site_role_pk' }) id!: string;
  @Column({ type: 'uuid' }) site_id!: string;
  @Column({ type: 'uuid' }) member_id!: string;
  @Column({ type: 'text' }) role!: 'manager' | 'inspector' | 'reviewer' | 'viewer';
  @Column({ type: 'timestamptz' }) given_at!: Date;

  @ManyToOne(() => Site, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'site_id', foreignKeyConstraintName: 'site_role_site_fk' })
  site?: Site;
  @ManyToOne(() => Member, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'member_id', foreignKeyConstraintName: 'site_role_member_fk' })
  member?: Member;
}
