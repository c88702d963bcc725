import { useByKey as findUse } from '@embertally/shared/catalogue/uses';
import { roomsOfBuildingInReadingOrder } from '@embertally/shared/survey/derive/rooms-in-reading-order';
import { roomArea } from '@embertally/shared/survey/derive/room-area';
import { roomHeight } from '@embertally/shared/survey/derive/room-height';
import type { Room, SurveyDocument } from '@embertally/shared/survey/survey-document';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import type { UnitSystem } from '@embertally/shared/units/unit-system';

/** "Room 1 of 14 · 96.0 m² · 4.20 m high · used as theatre store" */
export function roomLine(document: SurveyDocument, room: Room, units: UnitSystem): string {
  const ids = roomsOfBuildingInReadingOrder(document).map(({ id }) => id);
  const area = roomArea(document, room.id);
  const shown = (value: number, unit: string): string => {
    const { text, unit: symbol } = formatQuantity(value, unit, units);
    return `${text} ${symbol}`;
  };
  return [
    `Room ${ids.indexOf(room.id) + 1} of ${ids.length}`,
    area === null ? null : shown(area, 'm2'),
    `${shown(roomHeight(document, room), 'm')} high`,
    room.use === null ? 'use not recorded' : `used as ${wordOfUse(room.use)}`,
  ]
    .filter((part) => part !== null)
    .join(' · ');
}

/** A use of the catalogue by its label, a person's own word as it was written. */
function wordOfUse(use: string): string {
  const label = findUse(use)?.label;
  return label === undefined ? use : label.charAt(0).toLocaleLowerCase('en') + label.slice(1);
}
