import { Column, Entity, Index, PrimaryColumn } from 'typeorm';

/** One try at a password. A row is written before the password is looked at, so that parallel guesses count. */
@Entity('sign_in_attempt')
@Index('sign_in_attempt_account', ['account_hash', 'at'])
@Index('sign_in_attempt_ip', ['ip', 'at'])
@Index('sign_in_attempt_at', ['at'])
export class SignInAttempt {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'sign_in_attempt_pk' }) id!: string;
  /** SHA-256 of what is being guessed at: an address, or an address from one known device. */
  @Column({ type: 'text' }) account_hash!: string;
  @Column({ type: 'text' }) ip!: string;
  @Column({ type: 'boolean' }) failed!: boolean;
  @Column({ type: 'timestamptz' }) at!: Date;
}
