import type { Enclosure, GrowthClass, IgnitionClass, Keeping } from '@embertally/shared/catalogue/catalogue-row';
import { KINDS } from '@embertally/shared/catalogue/kinds';
import { LININGS } from '@embertally/shared/catalogue/linings';
import { MATERIALS } from '@embertally/shared/catalogue/materials';
import { USES } from '@embertally/shared/catalogue/uses';
import {
  enclosure,
  growthClass,
  ignitionClass,
  keeping,
  liningLayer,
  type Entry,
} from '@embertally/shared/survey/versions/v1';
import { describe, expect, expectTypeOf, it } from 'vitest';

describe('the words of the catalogue', () => {
  it('are the survey document’s own', () => {
    expectTypeOf<GrowthClass>().toEqualTypeOf<NonNullable<Entry['growth']>>();
    expectTypeOf<IgnitionClass>().toEqualTypeOf<NonNullable<Entry['ignition_class']>>();
    expectTypeOf<Enclosure>().toEqualTypeOf<Entry['enclosure']>();
    expectTypeOf<Keeping>().toEqualTypeOf<Entry['keeping']>();
  });

  it('are taken by the survey document in every row', () => {
    for (const kind of KINDS) {
      expect(ignitionClass.safeParse(kind.ignition_class).success, kind.key).toBe(true);
      expect(enclosure.safeParse(kind.enclosure).success, kind.key).toBe(true);
      expect(keeping.safeParse(kind.keeping).success, kind.key).toBe(true);
      if (kind.growth !== null) expect(growthClass.safeParse(kind.growth).success, kind.key).toBe(true);
    }
    for (const material of MATERIALS) {
      expect(ignitionClass.safeParse(material.ignition_class).success, material.key).toBe(true);
    }
    for (const use of USES) expect(growthClass.safeParse(use.growth).success, use.key).toBe(true);
    for (const row of LININGS) {
      for (const layer of row.layers) expect(liningLayer.safeParse(layer).success, row.key).toBe(true);
    }
  });
});
