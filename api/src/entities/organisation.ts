import { Column, Entity, PrimaryColumn } from 'typeorm';

/** An employer whose people meet others on sites. */
@Entity('organisation')
export class Organisation {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'organisation_pk' }) id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'timestamptz' }) created_at!: Date;
}
