import { MATERIALS } from '@embertally/shared/catalogue/materials';
import type { materialSchema } from '@embertally/shared/contracts/materials';
import type { z } from 'zod/mini';
import type { Actor } from '../actor.ts';
import type { Database } from '../repositories/database.ts';
import { OwnMaterialRepository, type PlaceableRow } from '../repositories/own-material-repository.ts';

type Row = z.infer<typeof materialSchema>;

const BUILT_IN = MATERIALS.map((row) => JSON.stringify({ ...row, own: null }));

/** Materials that may be placed, written as JSON once: what is built in never changes while the program runs. */
export class MaterialService {
  private readonly database: Database;

  constructor(database: Database) {
    this.database = database;
  }

  async listText(actor: Actor, of?: 'built-in' | 'own'): Promise<string> {
    const own =
      of === 'built-in'
        ? []
        : await new OwnMaterialRepository(this.database.statements).placeable(actor.organisationId);
    const rows = [...(of === 'own' ? [] : BUILT_IN), ...own.map((row) => JSON.stringify(present(row)))];
    return `{"items":[${rows.join(',')}]}`;
  }
}

/** An own material as a row of the catalogue. */
function present({ material_id, version, draft, derived, approved_by, approved_at }: PlaceableRow): Row {
  const { density_kg_m3 } = draft;
  return {
    key: material_id,
    label: draft.label,
    synonyms: draft.synonyms ?? [],
    group: draft.group ?? 'products',
    net_heat_MJ_kg: derived.net_MJ_kg,
    low_MJ_kg: derived.low_MJ_kg,
    high_MJ_kg: derived.high_MJ_kg,
    gross_heat_MJ_kg: derived.gross_MJ_kg,
    formula: 'formula' in draft ? (draft.formula ?? null) : null,
    cellulosic: derived.cellulosic,
    combustion_factor: derived.combustion_factor,
    ignition_class: derived.ignition_class,
    radiative_fraction: derived.radiative_fraction,
    soot_yield: draft.soot_yield ?? null,
    co_yield: draft.co_yield ?? null,
    bulk_density_kg_m3:
      density_kg_m3 === undefined ? null : { typical: density_kg_m3, low: density_kg_m3, high: density_kg_m3 },
    moisture_pct_dry: perDryMass(derived.moisture_pct_wet),
    hazards: draft.hazards ?? [],
    source: { title: draft.source, locator: `own material, version ${version}`, fromMemory: false },
    own: {
      version,
      way: draft.way,
      heat_source: derived.heat_source,
      moisture_pct_wet: derived.moisture_pct_wet,
      curve:
        derived.curve === null
          ? null
          : { per: derived.curve.per, points: derived.curve.points.map(([t, q]) => [t, q]) },
      approved_by,
      approved_at: approved_at.toISOString(),
    },
  };
}

/** Percent of wet mass as percent of dry mass; null where nothing dry is left. */
function perDryMass(wet_pct: number | null): number | null {
  return wet_pct === null || wet_pct >= 100 ? null : (100 * wet_pct) / (100 - wet_pct);
}
