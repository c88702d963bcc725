import { Column, Entity, PrimaryColumn } from 'typeorm';

/** The head of one chain of audit events; locked while an event is added. */
@Entity('audit_chain')
export class AuditChain {
  @PrimaryColumn({ type: 'text', primaryKeyConstraintName: 'audit_chain_pk' }) kind!: 'site' | 'organisation' | 'house';
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'audit_chain_pk' }) id!: string;
  @Column({ type: 'integer' }) position!: number;
  @Column({ type: 'text' }) hash!: string;
}
