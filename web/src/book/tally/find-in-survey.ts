import type { SurveyDocument } from '@embertally/shared/survey/survey-document';

export interface Found {
  readonly kind: 'room' | 'entry';
  readonly id: string;
  readonly roomId: string;
  readonly label: string;
  /** Where it is, and for an entry which of its materials fitted. */
  readonly detail: string;
}

const MOST = 60;

const fold = (text: string): string => text.normalize('NFD').replaceAll(/\p{M}/gu, '').toLowerCase();

/**
 * Rooms, entries and materials of the whole building that hold every word typed; capitals and diacritics do not matter.
 * Rooms come first. At most 60, and `more` says how many were left out.
 */
export function findInSurvey(
  document: SurveyDocument,
  query: string,
): { readonly found: readonly Found[]; readonly more: number } {
  const words = fold(query)
    .split(/\s+/)
    .filter((word) => word !== '');
  if (words.length === 0) return { found: [], more: 0 };
  const fits = (text: string): boolean => {
    const folded = fold(text);
    return words.every((word) => folded.includes(word));
  };
  const found: Found[] = [];
  for (const room of document.rooms.values()) {
    if (!fits(room.name)) continue;
    const storey = document.storeys.get(room.storey_id)?.name ?? '';
    found.push({ kind: 'room', id: room.id, roomId: room.id, label: room.name, detail: storey });
  }
  for (const entry of document.entries.values()) {
    const room = document.rooms.get(entry.room_id);
    if (room === undefined) continue;
    const material = entry.parts.find((part) => fits(part.label));
    if (!fits(entry.label) && material === undefined) continue;
    const detail = material === undefined ? room.name : `${room.name} · ${material.label}`;
    found.push({ kind: 'entry', id: entry.id, roomId: room.id, label: entry.label, detail });
  }
  return { found: found.slice(0, MOST), more: Math.max(0, found.length - MOST) };
}
