import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Member } from './member.ts';
import { Person } from './person.ts';

/** A signed-in browser. Only the SHA-256 of its token is kept. */
@Entity('session')
@Index('session_person', ['person_id'])
@Index('session_member', ['member_id'])
@Index('session_expires_at', ['expires_at'])
export class Session {
  @PrimaryColumn({ type: 'text', primaryKeyConstraintName: 'session_pk' }) token_hash!: string;
  @Column({ type: 'uuid' }) person_id!: string;
  /** The membership this session acts for. */
  @Column({ type: 'uuid' }) member_id!: string;
  @Column({ type: 'timestamptz' }) created_at!: Date;
  @Column({ type: 'timestamptz' }) expires_at!: Date;

  @ManyToOne(() => Person, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'person_id', foreignKeyConstraintName: 'session_person_fk' })
  person?: Person;
  @ManyToOne(() => Member, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'member_id', foreignKeyConstraintName: 'session_member_fk' })
  member?: Member;
}
