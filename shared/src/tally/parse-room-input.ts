import type { z } from 'zod/mini';
import { ringInRegion } from '../geometry/ring-in-region.ts';
import { liningByKey } from '../catalogue/linings.ts';
import { materialByKey } from '../catalogue/materials.ts';
import { useByKey } from '../catalogue/uses.ts';
import { OutOfRangeError } from '../methods/estimate.ts';
import { partHeat } from './part-heat.ts';
import { pointsOf } from './points-of.ts';
import { ringFault } from './ring-fault.ts';
import { roomInputSchema, type RoomInput, type RoomInputEntry, type RoomInputPart } from './room-input.ts';

export interface RoomInputFault {
  /** JSON pointer to the field. */
  readonly pointer: string;
  readonly code: string;
  /** One sentence for a person: what is wrong and what is expected. */
  readonly message: string;
}

export type ParsedRoomInput =
  { readonly ok: true; readonly value: RoomInput } | { readonly ok: false; readonly errors: RoomInputFault[] };

const LARGEST_ENTRY_KG = 1_000_000;
const LEAST_STEP_S = 0.001;
const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/**
 * Checks anything that claims to be the input of an estimate and lists every fault, never only the first: unknown
 * fields, wrong types, negative and non-finite numbers, self-crossing rings, unknown keys, an entry over 1,000 t.
 * The rules that need whole fields run once the fields themselves are sound.
 */
export function parseRoomInput(candidate: unknown): ParsedRoomInput {
  const parsed = roomInputSchema.safeParse(candidate, { reportInput: true });
  if (!parsed.success) return { ok: false, errors: parsed.error.issues.flatMap((issue) => schemaFaults(issue)) };
  const errors = [...roomFaults(parsed.data), ...contentsFaults(parsed.data)];
  return errors.length === 0 ? { ok: true, value: parsed.data } : { ok: false, errors };
}

function schemaFaults(issue: z.core.$ZodIssue): RoomInputFault[] {
  const at = (path: readonly PropertyKey[]) => pointerTo(path);
  switch (issue.code) {
    case 'unrecognized_keys':
      return issue.keys.map((key) => ({
        pointer: at([...issue.path, key]),
        code: 'unknown_field',
        message: `“${key.slice(0, 80)}” is not a field of the input. Remove it or check its spelling.`,
      }));
    case 'invalid_type':
      return [
        {
          pointer: at(issue.path),
          code: issue.expected === 'number' && typeof issue.input === 'number' ? 'not_finite' : 'wrong_type',
          message: `Enter ${article(issue.expected)} here.`,
        },
      ];
    case 'invalid_value':
      return [
        {
          pointer: at(issue.path),
          code: 'unknown_value',
          message: `Enter one of: ${issue.values.map(String).join(', ')}.`,
        },
      ];
    case 'too_small':
      return [{ pointer: at(issue.path), code: 'too_small', message: boundText(issue.origin, 'at least', issue) }];
    case 'too_big':
      return [{ pointer: at(issue.path), code: 'too_large', message: boundText(issue.origin, 'at most', issue) }];
    case 'invalid_union':
      return [
        {
          pointer: at(issue.path),
          code: 'wrong_type',
          message: 'This has none of the shapes that are understood here.',
        },
        ...closestBranch(issue).flatMap((inner) => schemaFaults({ ...inner, path: [...issue.path, ...inner.path] })),
      ];
    default:
      return [{ pointer: at(issue.path), code: 'wrong_value', message: 'This value is not understood here.' }];
  }
}

/** The branch of a union the value came nearest to: the one with the fewest faults. */
function closestBranch(issue: z.core.$ZodIssueInvalidUnion): readonly z.core.$ZodIssue[] {
  return [...issue.errors].sort((a, b) => a.length - b.length)[0] ?? [];
}

function article(expected: string): string {
  if (expected === 'number') return 'a number, like 12.5';
  if (expected === 'int') return 'a whole number, like 3';
  if (expected === 'array' || expected === 'tuple') return 'a list';
  if (expected === 'string') return 'text';
  if (expected === 'boolean') return 'true or false';
  return `a value of type ${expected}`;
}

function boundText(origin: string, side: string, issue: z.core.$ZodIssueTooSmall | z.core.$ZodIssueTooBig): string {
  const bound = String(issue.code === 'too_small' ? issue.minimum : issue.maximum);
  if (origin === 'array') return `Give ${side} ${bound} items.`;
  if (origin === 'string') return `Use ${side} ${bound} characters.`;
  return issue.inclusive
    ? `Enter a number of ${side} ${bound}.`
    : `Enter a number ${issue.code === 'too_small' ? 'above' : 'below'} ${bound}.`;
}

function roomFaults({ room }: RoomInput): RoomInputFault[] {
  const faults: RoomInputFault[] = [];
  const add = (pointer: string, code: string, message: string) => faults.push({ pointer, code, message });
  for (const [pointer, ring] of [
    ['/room/ring_m', room.ring_m] as const,
    ...(room.holes_m ?? []).map((hole, i) => [`/room/holes_m/${i}`, hole] as const),
  ]) {
    const fault = ringFault(ring);
    if (fault) add(pointer, fault.code, fault.message);
  }
  if (faults.length === 0) faults.push(...holeFaults(room));
  if (room.use != null && !useByKey(room.use)) add('/room/use', 'unknown_key', unknownKey('use', room.use));
  for (const side of ['walls', 'ceiling', 'floor'] as const) {
    const surface = room.lining?.[side];
    if (surface && 'key' in surface && !liningByKey(surface.key)) {
      add(`/room/lining/${side}/key`, 'unknown_key', unknownKey('lining', surface.key));
    }
  }
  (room.openings ?? []).forEach((opening, i) => {
    const top = (opening.sill_m ?? 0) + opening.height_m;
    if (top > room.height_m + 0.001) {
      add(
        `/room/openings/${i}/height_m`,
        'too_tall',
        `The opening reaches ${top.toFixed(2)} m but the room is ${room.height_m.toFixed(2)} m high.`,
      );
    }
  });
  return faults;
}

/** A hole lies in the room, so that floor is taken off once and never below nothing. */
function holeFaults(room: RoomInput['room']): RoomInputFault[] {
  const outer = pointsOf(room.ring_m);
  const holes = (room.holes_m ?? []).map(pointsOf);
  return holes.flatMap((hole, i) =>
    ringInRegion(hole, { ring: outer, holes: holes.slice(0, i) })
      ? []
      : [
          {
            pointer: `/room/holes_m/${i}`,
            code: 'hole_outside',
            message: 'The hole reaches outside the room or over another hole.',
          },
        ],
  );
}

function contentsFaults({ contents, options }: RoomInput): RoomInputFault[] {
  const faults: RoomInputFault[] = [];
  const seen = new Set<string>();
  contents.forEach((entry, i) => {
    if (seen.has(entry.id)) {
      faults.push({ pointer: `/contents/${i}/id`, code: 'duplicate_id', message: 'Another entry has the same id.' });
    }
    seen.add(entry.id);
    faults.push(...entryFaults(entry, `/contents/${i}`));
  });
  const first = options?.first_entry ?? null;
  if (first !== null && !seen.has(first)) {
    faults.push({
      pointer: '/options/first_entry',
      code: 'unknown_entry',
      message: `No entry has the id “${first.slice(0, 80)}”. Give the id of the entry that burns first, or leave it out.`,
    });
  }
  return faults;
}

function entryFaults(entry: RoomInputEntry, pointer: string): RoomInputFault[] {
  const faults: RoomInputFault[] = [];
  const mass = entry.count * entry.parts.reduce((sum, part) => sum + part.mass_kg, 0);
  if (mass > LARGEST_ENTRY_KG) {
    faults.push({
      pointer: `${pointer}/count`,
      code: 'too_heavy',
      message: `The entry weighs ${Math.round(mass / 1000)} t; an entry of more than 1,000 t is not accepted. Check count and mass.`,
    });
  }
  entry.parts.forEach((part, i) => {
    const at = `${pointer}/parts/${i}`;
    if (part.material == null && part.net_heat_MJ_kg == null) {
      faults.push({
        pointer: at,
        code: 'no_heat',
        message: 'Name a material of the catalogue or give a net heat in MJ/kg.',
      });
    }
    const organisationsOwn = part.net_heat_MJ_kg != null && UUID.test(part.material ?? '');
    if (part.material != null && !organisationsOwn && !materialByKey(part.material)) {
      faults.push({ pointer: `${at}/material`, code: 'unknown_key', message: unknownKey('material', part.material) });
    }
    if (part.basis === 'gross' && part.hydrogen_mass_fraction == null) {
      faults.push({
        pointer: `${at}/hydrogen_mass_fraction`,
        code: 'missing',
        message: 'A gross heat needs the mass fraction of hydrogen to become a net heat.',
      });
    } else if (part.basis === 'gross' && !(netHeatOf(entry, part) > 0)) {
      faults.push({
        pointer: `${at}/net_heat_MJ_kg`,
        code: 'no_net_heat',
        message:
          'The water takes more heat than the gross heat holds, so no net heat is left. Check the heat, its basis, hydrogen and moisture.',
      });
    }
  });
  const curve = entry.curve ?? [];
  const backwards = curve.findIndex(([t], i) => i > 0 && !(t - curve[i - 1]![0] >= LEAST_STEP_S));
  if (backwards > 0) {
    faults.push({
      pointer: `${pointer}/curve/${backwards}`,
      code: 'not_rising',
      message: 'Each time of the curve must be at least 0.001 s later than the one before it.',
    });
  }
  return faults;
}

/** Net, as received, MJ/kg; −1 where hydrogen and gross heat contradict each other. */
function netHeatOf(entry: RoomInputEntry, part: RoomInputPart): number {
  try {
    return partHeat(entry, part).heat;
  } catch (error) {
    if (error instanceof OutOfRangeError) return -1;
    throw error;
  }
}

function unknownKey(what: string, key: string): string {
  return `The catalogue has no ${what} “${key.slice(0, 80)}”. Choose one from its list.`;
}

function pointerTo(path: readonly PropertyKey[]): string {
  return path.map((step) => `/${String(step).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');
}
