import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Room } from './room.ts';

/** One line of a room's contents. */
@Entity('entry')
@Index('entry_room', ['survey_id', 'room_id'])
export class Entry {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'entry_pk' }) survey_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'entry_pk' }) id!: string;
  @Column({ type: 'uuid' }) room_id!: string;
  @Column({ type: 'text', nullable: true }) kind!: string | null;
  @Column({ type: 'text' }) label!: string;
  @Column({ type: 'double precision' }) count!: number;
  @Column({ type: 'jsonb' }) parts!: unknown;
  @Column({ type: 'double precision' }) x_m!: number;
  @Column({ type: 'double precision' }) y_m!: number;
  @Column({ type: 'double precision' }) rotation_deg!: number;
  @Column({ type: 'double precision' }) base_height_m!: number;
  @Column({ type: 'double precision' }) width_m!: number;
  @Column({ type: 'double precision' }) depth_m!: number;
  @Column({ type: 'double precision' }) height_m!: number;
  @Column({ type: 'text' }) keeping!: string;
  @Column({ type: 'text' }) enclosure!: string;
  @Column({ type: 'double precision', nullable: true }) sealed_rating_min!: number | null;
  @Column({ type: 'text' }) evidence!: string;
  @Column({ type: 'text', nullable: true }) growth!: string | null;
  @Column({ type: 'double precision', nullable: true }) peak_kW!: number | null;
  @Column({ type: 'jsonb', nullable: true }) curve!: unknown;
  @Column({ type: 'double precision', nullable: true }) radiative_fraction!: number | null;
  @Column({ type: 'text', nullable: true }) ignition_class!: string | null;
  @Column({ type: 'double precision', nullable: true }) ignites_at_kW_m2!: number | null;
  @Column({ type: 'text' }) note!: string;
  @Column({ type: 'jsonb' }) photos!: unknown;
  @Column({ type: 'text', nullable: true }) recorded_by!: string | null;
  @Column({ type: 'timestamptz', nullable: true }) recorded_at!: Date | null;
  @Column({ type: 'text', nullable: true }) confirmed_by!: string | null;
  @Column({ type: 'timestamptz', nullable: true }) confirmed_at!: Date | null;
  @Column({ type: 'jsonb', nullable: true }) measure!: unknown;
  @Column({ type: 'integer' }) version!: number;

  @ManyToOne(() => Room, { onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'survey_id', referencedColumnName: 'survey_id', foreignKeyConstraintName: 'entry_room_fk' },
    { name: 'room_id', referencedColumnName: 'id', foreignKeyConstraintName: 'entry_room_fk' },
  ])
  room?: Room;
}
