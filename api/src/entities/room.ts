import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Storey } from './storey.ts';

@Entity('room')
@Index('room_storey', ['survey_id', 'storey_id'])
export class Room {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'room_pk' }) survey_id!: string;
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'room_pk' }) id!: string;
  @Column({ type: 'uuid' }) storey_id!: string;
  @Column({ type: 'text' }) name!: string;
  @Column({ type: 'jsonb' }) ring!: unknown;
  @Column({ type: 'jsonb' }) holes!: unknown;
  @Column({ type: 'double precision', nullable: true }) height_m!: number | null;
  @Column({ type: 'text', nullable: true }) use!: string | null;
  @Column({ type: 'jsonb' }) lining!: unknown;
  @Column({ type: 'jsonb' }) protection!: unknown;
  @Column({ type: 'double precision', nullable: true }) rating_min!: number | null;
  @Column({ type: 'double precision', nullable: true }) danger_of_activation!: number | null;
  @Column({ type: 'double precision', nullable: true }) measured_floor_area_m2!: number | null;
  @Column({ type: 'double precision', nullable: true }) compartment_floor_m2!: number | null;
  @Column({ type: 'boolean', nullable: true }) bounded_by_rated_construction!: boolean | null;
  @Column({ type: 'double precision' }) roof_vents_m2!: number;
  @Column({ type: 'text' }) roof_vents_state!: string;
  @Column({ type: 'text' }) notes!: string;
  @Column({ type: 'jsonb', nullable: true }) assumptions!: unknown;
  @Column({ type: 'jsonb' }) photos!: unknown;
  @Column({ type: 'text' }) to_do!: string;
  @Column({ type: 'integer' }) version!: number;

  @ManyToOne(() => Storey, { onDelete: 'CASCADE' })
  @JoinColumn([
    { name: 'survey_id', referencedColumnName: 'survey_id', foreignKeyConstraintName: 'room_storey_fk' },
    { name: 'storey_id', referencedColumnName: 'id', foreignKeyConstraintName: 'room_storey_fk' },
  ])
  storey?: Storey;
}
