import { liningByKey } from '@embertally/shared/catalogue/linings';
import { useByKey as findUse } from '@embertally/shared/catalogue/uses';
import type { Lining, LiningSurface, Protection } from '@embertally/shared/survey/survey-document';

/** A use as tables say it; a person's own word stays as it was written. */
export function wordsOfUse(use: string | null): string {
  if (use === null) return '–';
  return findUse(use)?.label ?? use;
}

export function surfaceWords(surface: LiningSurface | null): string {
  if (surface === null) return 'not known';
  if ('key' in surface) return liningByKey(surface.key)?.label ?? surface.key;
  return surface.layers.length === 1 ? 'one layer of its own' : `${surface.layers.length} layers of its own`;
}

/** "Concrete" where all three are alike, else each surface by name. */
export function liningWords(lining: Lining): string {
  const [walls, ceiling, floor] = [lining.walls, lining.ceiling, lining.floor].map(surfaceWords);
  if (walls === ceiling && ceiling === floor) return walls ?? '';
  return `Walls: ${walls}. Ceiling: ${ceiling}. Floor: ${floor}.`;
}

/** What protects the room, in a few words; what nobody has looked at is said to be unknown. */
export function protectionWords(protection: Protection): string {
  const words = [
    protection.sprinklers === null ? null : 'sprinklers',
    {
      none: 'no detection',
      heat: 'heat detection',
      smoke: 'smoke detection',
      both: 'heat and smoke detection',
      unknown: null,
    }[protection.detection],
    protection.alarm_to_brigade === true ? 'alarm to brigade' : null,
    {
      none: 'no brigade',
      works: 'works brigade',
      'off-site': 'off-site brigade',
      both: 'works and off-site brigade',
      unknown: null,
    }[protection.brigade],
  ].filter((word) => word !== null);
  return words.length === 0 ? 'not known' : words.join(', ');
}
