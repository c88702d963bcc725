import type { SurveyDocument } from '../survey-document.ts';

/** A name no room of the survey has yet: "Room 1", "Room 2", … */
export function nextRoomName(document: SurveyDocument): string {
  const taken = new Set([...document.rooms.values()].map((room) => room.name));
  for (let number = document.rooms.size + 1; ; number += 1) {
    if (!taken.has(`Room ${number}`)) return `Room ${number}`;
  }
}
