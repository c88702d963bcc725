import type { RoomInput } from '@embertally/shared/tally/room-input';

export interface QuestionFormProps {
  /** The same object until the room changes. */
  readonly input: RoomInput;
}
