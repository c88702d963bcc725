import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Room } from './room.ts';

/** The headline of one room as last computed. */
@Entity('room_summary')
@Index('room_summary_stale', ['survey_id'], { where: '"stale"' })
export class RoomSummary {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'room_summary_pk' }) survey_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'room_summary_pk' }) room_id!: string;
  @Column({ type: 'double precision', nullable: true }) floor_area_m2!: number | null;
  @Column({ type: 'double precision', nullable: true }) load_total_MJ!: number | null;
  @Column({ type: 'double precision', nullable: true }) load_per_floor_MJ_m2!: number | null;
  @Column({ type: 'double precision', nullable: true }) peak_kW!: number | null;
  @Column({ type: 'double precision', nullable: true }) flashover_time_s!: number | null;
  @Column({ type: 'text' }) standing!: string;
  @Column({ type: 'double precision', nullable: true }) ratio!: number | null;
  @Column({ type: 'integer' }) entries!: number;
  @Column({ type: 'text' }) engine!: string;
  @Column({ type: 'boolean' }) stale!: boolean;
  /** Rises whenever the row is marked stale: a result computed from an older state does not clear a newer mark. */
  @Column({ type: 'integer' }) mark!: number;
  @Column({ type: 'timestamptz', nullable: true }) computed_at!: Date | null;

  @ManyToOne(() => Room, { onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'survey_id', referencedColumnName: 'survey_id', foreignKeyConstraintName: 'room_summary_room_fk' },
    { name: 'room_id', referencedColumnName: 'id', foreignKeyConstraintName: 'room_summary_room_fk' },
  ])
  room?: Room;
}
