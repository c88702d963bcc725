import type { ReportInput } from '../reports/report-input.ts';

/** A name any file system takes: letters and digits of any script, everything else a hyphen. */
export function exportFileName(input: ReportInput): string {
  const room = input.document.rooms.find((one) => one.id === input.room_id);
  const words = [input.building, room?.name ?? '', `sequence ${input.document.sequence}`].join(' ');
  const plain = words
    .normalize('NFC')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '');
  return `${[...plain].slice(0, 80).join('')}.pdf`;
}
