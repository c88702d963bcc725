import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Organisation } from './organisation.ts';

/** A material of an organisation's own. What it is stands in its versions. */
@Entity('own_material')
@Index('own_material_organisation', ['organisation_id'])
export class OwnMaterial {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'own_material_pk' }) id!: string;
  @Column({ type: 'uuid' }) organisation_id!: string;
  /** Name of the version made last. */
  @Column({ type: 'text' }) label!: string;
  /** Number of the version made last. */
  @Column({ type: 'integer' }) latest!: number;
  /** Number of the version that may be placed. */
  @Column({ type: 'integer', nullable: true }) in_force!: number | null;
  /** Rises with every change of the material or one of its versions. */
  @Column({ type: 'integer' }) tag!: number;
  @Column({ type: 'timestamptz' }) created_at!: Date;

  @ManyToOne(() => Organisation, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'organisation_id', foreignKeyConstraintName: 'own_material_organisation_fk' })
  organisation?: Organisation;
}
