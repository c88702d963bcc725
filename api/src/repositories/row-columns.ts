import type { EntityKind } from '@embertally/shared/survey/survey-document';

type SqlType = 'uuid' | 'text' | 'double precision' | 'boolean' | 'jsonb' | 'timestamptz';

/** The columns of each kind's table that are fields of the document, with their types; named as in the document. */
export const ROW_COLUMNS: Readonly<Record<EntityKind, Readonly<Record<string, SqlType>>>> = {
  storey: {
    id: 'uuid',
    name: 'text',
    level_m: 'double precision',
    height_m: 'double precision',
    wall_thickness_m: 'double precision',
    plan_picture: 'jsonb',
    north_deg: 'double precision',
  },
  corner: { id: 'uuid', storey_id: 'uuid', x_m: 'double precision', y_m: 'double precision' },
  room: {
    id: 'uuid',
    storey_id: 'uuid',
    name: 'text',
    ring: 'jsonb',
    holes: 'jsonb',
    height_m: 'double precision',
    use: 'text',
    lining: 'jsonb',
    protection: 'jsonb',
    rating_min: 'double precision',
    danger_of_activation: 'double precision',
    measured_floor_area_m2: 'double precision',
    compartment_floor_m2: 'double precision',
    bounded_by_rated_construction: 'boolean',
    roof_vents_m2: 'double precision',
    roof_vents_state: 'text',
    notes: 'text',
    assumptions: 'jsonb',
    photos: 'jsonb',
    to_do: 'text',
  },
  opening: {
    id: 'uuid',
    storey_id: 'uuid',
    wall: 'jsonb',
    offset_m: 'double precision',
    width_m: 'double precision',
    height_m: 'double precision',
    sill_m: 'double precision',
    kind: 'text',
    state: 'text',
    label: 'text',
  },
  entry: {
    id: 'uuid',
    room_id: 'uuid',
    kind: 'text',
    label: 'text',
    count: 'double precision',
    parts: 'jsonb',
    x_m: 'double precision',
    y_m: 'double precision',
    rotation_deg: 'double precision',
    base_height_m: 'double precision',
    width_m: 'double precision',
    depth_m: 'double precision',
    height_m: 'double precision',
    keeping: 'text',
    enclosure: 'text',
    sealed_rating_min: 'double precision',
    evidence: 'text',
    growth: 'text',
    peak_kW: 'double precision',
    curve: 'jsonb',
    radiative_fraction: 'double precision',
    ignition_class: 'text',
    ignites_at_kW_m2: 'double precision',
    note: 'text',
    photos: 'jsonb',
    recorded_by: 'text',
    recorded_at: 'timestamptz',
    confirmed_by: 'text',
    confirmed_at: 'timestamptz',
    measure: 'jsonb',
  },
};

const quoted = (name: string): string => `"${name}"`;

/** Column names of a kind for a statement, each with a prefix such as `r.`. */
export function columnNames(kind: EntityKind, prefix = ''): string {
  return Object.keys(ROW_COLUMNS[kind])
    .map((name) => prefix + quoted(name))
    .join(', ');
}

/** Column definitions of a kind for `jsonb_to_recordset`. */
export function columnDefinitions(kind: EntityKind): string {
  return Object.entries(ROW_COLUMNS[kind])
    .map(([name, type]) => `${quoted(name)} ${type}`)
    .join(', ');
}

/** Columns as the document writes them: times as ISO text in UTC. */
export function documentColumns(kind: EntityKind): string {
  return Object.entries(ROW_COLUMNS[kind])
    .map(([name, type]) =>
      type === 'timestamptz'
        ? `to_char(${quoted(name)} AT TIME ZONE 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.MS"Z"') AS ${quoted(name)}`
        : quoted(name),
    )
    .join(', ');
}

/** Fields of a kind that hold a time. */
export function timeFields(kind: EntityKind): readonly string[] {
  return Object.entries(ROW_COLUMNS[kind])
    .filter(([, type]) => type === 'timestamptz')
    .map(([name]) => name);
}
