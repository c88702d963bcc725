import { Column, Entity, Index, JoinColumn, ManyToOne, PrimaryColumn } from 'typeorm';
import { Building } from './building.ts';
import { Person } from './person.ts';

/**
 * A bound on a room set by somebody. Not part of the document, and without a foreign key to the room: a room that is
 * deleted and brought back by undo finds its limits again.
 */
@Entity('room_limit')
@Index('room_limit_building_room', ['building_id', 'room_id'])
@Index('room_limit_person', ['entered_by'])
export class RoomLimit {
  @PrimaryColumn({ type: 'uuid', primaryKeyConstraintName: 'room_limit_pk' }) id!: string;
  @Column({ type: 'uuid' }) building_id!: string;
  @Column({ type: 'uuid' }) room_id!: string;
  @Column({ type: 'text' }) quantity!: string;
  @Column({ type: 'double precision' }) bound!: number;
  @Column({ type: 'text' }) source!: 'permit' | 'policy' | 'house-rule';
  @Column({ type: 'text' }) set_by!: string;
  @Column({ type: 'date' }) since!: string;
  @Column({ type: 'uuid' }) entered_by!: string;
  @Column({ type: 'timestamptz' }) entered_at!: Date;
  @Column({ type: 'integer' }) version!: number;

  @ManyToOne(() => Building, { onDelete: 'CASCADE' })
  @JoinColumn({ name: 'building_id', foreignKeyConstraintName: 'room_limit_building_fk' })
  building?: Building;
  @ManyToOne(() => Person, { onDelete: 'RESTRICT' })
  @JoinColumn({ name: 'entered_by', foreignKeyConstraintName: 'room_limit_person_fk' })
  person?: Person;
}
