import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { OwnMaterialVersion } from './own-material-version.ts';
import { StoredFile } from './stored-file.ts';

/** A file that shows where the figures of a version come from; as unchangeable as the version. */
@Entity('own_material_evidence')
@Index('own_material_evidence_file', ['file_id'])
export class OwnMaterialEvidence {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'own_material_evidence_pk' }) version_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'own_material_evidence_pk' }) file_id!: string;
  @Column({ type: 'integer' }) position!: number;

  @ManyToOne(() => OwnMaterialVersion, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'version_id', foreignKeyConstraintName: 'own_material_evidence_version_fk' })
  version?: OwnMaterialVersion;
  @ManyToOne(() => StoredFile, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'file_id', foreignKeyConstraintName: 'own_material_evidence_file_fk' })
  file?: StoredFile;
}
