import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn, Unique } from 'typeorm';
import { OwnMaterial } from './own-material.ts';
import { Person } from './person.ts';

/**
 * One version of an own material. The database refuses to change what a version says once it is put forward, steps
 * between states that do not follow, and approval by its author. At most one version is still open.
 */
@Entity('own_material_version')
@Unique('own_material_version_number_unique', ['material_id', 'version'])
@Index('own_material_version_one_open', ['material_id'], {
  unique: true,
  where: `"state" IN ('draft', 'put-forward')`,
})
@Index('own_material_version_author', ['author_id'])
@Index('own_material_version_decided_by', ['decided_by'])
@Index('own_material_version_withdrawn_by', ['withdrawn_by'])
export class OwnMaterialVersion {
  /** Made by the client, so that sending a version twice makes one. */
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'own_material_version_pk' }) id!: string;
  @Column({ type: 'uuid' }) material_id!: string;
  @Column({ type: 'integer' }) version!: number;
  @Column({ type: 'text' }) state!: 'draft' | 'put-forward' | 'approved' | 'returned' | 'withdrawn';
  /** What the person stated. */
  @Column({ type: 'jsonb' }) draft!: unknown;
  /** What the server derived from it, with the versions of the methods and without workings; `json` keeps it as written. */
  @Column({ type: 'json' }) derived!: unknown;
  @Column({ type: 'double precision' }) net_MJ_kg!: number;
  @Column({ type: 'double precision' }) low_MJ_kg!: number;
  @Column({ type: 'double precision' }) high_MJ_kg!: number;
  /** Long and seldom read. */
  @Column({ type: 'json' }) workings!: unknown;
  @Column({ type: 'uuid' }) author_id!: string;
  @Column({ type: 'timestamptz' }) made_at!: Date;
  @Column({ type: 'timestamptz' }) edited_at!: Date;
  @Column({ type: 'timestamptz', nullable: true }) put_forward_at!: Date | null;
  @Column({ type: 'uuid', nullable: true }) decided_by!: string | null;
  @Column({ type: 'timestamptz', nullable: true }) decided_at!: Date | null;
  @Column({ type: 'text', nullable: true }) decision_reason!: string | null;
  @Column({ type: 'uuid', nullable: true }) withdrawn_by!: string | null;
  @Column({ type: 'timestamptz', nullable: true }) withdrawn_at!: Date | null;
  @Column({ type: 'text', nullable: true }) withdrawal_reason!: string | null;

  @ManyToOne(() => OwnMaterial, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'material_id', foreignKeyConstraintName: 'own_material_version_material_fk' })
  material?: OwnMaterial;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'author_id', foreignKeyConstraintName: 'own_material_version_author_fk' })
  author?: Person;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'decided_by', foreignKeyConstraintName: 'own_material_version_decided_by_fk' })
  decider?: Person;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'withdrawn_by', foreignKeyConstraintName: 'own_material_version_withdrawn_by_fk' })
  withdrawer?: Person;
}
