import { Column, Entity, PrimaryColumn } from 'typeorm';

/** What happened, for good: the database refuses to change or delete a row. */
@Entity('audit_event')
export class AuditEvent {
  @PrimaryColumn({ type: 'text', primaryKeyConstraintName: 'audit_event_pk' }) chain_kind!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'audit_event_pk' }) chain_id!: string;
  @PrimaryColumn({ type: 'integer', primaryKeyConstraintName: 'audit_event_pk' }) position!: number;
  /** JSON text exactly as hashed. */
  @Column({ type: 'text' }) record!: string;
  /** SHA-256 of the previous event's hash, the position and the record, a line each. */
  @Column({ type: 'text' }) hash!: string;
}
