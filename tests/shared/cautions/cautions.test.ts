import { CAUTIONS, cautionsFor, type TallySection } from '@embertally/shared/cautions/cautions';
import { cautionSchema } from '@embertally/shared/contracts/cautions';
import { describe, expect, it } from 'vitest';

const SECTIONS: readonly TallySection[] = ['load', 'growth', 'room', 'burnout', 'response', 'spread', 'air', 'limits'];

describe('cautions', () => {
  it('are these eight, in this order', () => {
    expect(CAUTIONS.map((caution) => caution.id)).toEqual([
      'planning-figures',
      'qualified-person',
      'closed-room',
      'design-load',
      'openings-and-glass',
      'order-and-gaps',
      'unusual-goods',
      'survey-ages',
    ]);
  });

  it.each(CAUTIONS.map((caution) => [caution.id, caution] as const))(
    '%s defers to the local fire code, the authority having jurisdiction and licensed practice',
    (_, caution) => {
      for (const words of ['local fire code', 'authority having jurisdiction', 'licensed practice']) {
        expect(caution.text).toContain(words);
      }
      expect(caution.title.length).toBeLessThanOrEqual(70);
      expect(caution.text.length).toBeLessThanOrEqual(420);
      expect(SECTIONS.some((section) => cautionsFor([section]).includes(caution))).toBe(true);
    },
  );

  it('call nothing safe and give no orders for fighting a fire', () => {
    const words = CAUTIONS.map((caution) => `${caution.title} ${caution.text}`).join(' ');
    expect(words).not.toMatch(/\bsafe(ly|r)?\b/i);
    expect(words).toMatch(/no tactics/);
    expect(words).toMatch(/promise no time to escape/);
  });

  it.each([
    ['planning-figures', /approve no use, no layout and no stock/],
    ['qualified-person', /licensed practice where the building stands.*workings/],
    ['closed-room', /doors stand open.*no fire rating.*ceilings and ducts.*bigger/],
    ['design-load', /alarms, sprinklers and fire brigades.*may not allow them.*switched off.*as kept first/],
    ['openings-and-glass', /window breaks or a door is opened.*nearly closed room can flare/],
    ['order-and-gaps', /radiation in still air.*falls, melts.*draught.*no barrier.*no substitute/],
    ['unusual-goods', /Gas cylinders, aerosols, batteries, dusts, oxidisers.*react with water.*smouldering/],
    ['survey-ages', /counted or estimated on a date.*uncertainty.*survey again.*leave and call the fire service/],
  ])('%s keeps its facts', (id, facts) => {
    expect(CAUTIONS.find((caution) => caution.id === id)?.text).toMatch(facts);
  });

  it('stand with every section: the first two and the age of the survey always, the others where they belong', () => {
    for (const section of SECTIONS) {
      const ids = cautionsFor([section]).map((caution) => caution.id);
      expect(ids, section).toEqual(expect.arrayContaining(['planning-figures', 'qualified-person', 'survey-ages']));
    }
    expect(cautionsFor(['spread']).map((caution) => caution.id)).toContain('order-and-gaps');
    expect(cautionsFor(['load']).map((caution) => caution.id)).not.toContain('order-and-gaps');
    expect(cautionsFor(['burnout']).map((caution) => caution.id)).toContain('design-load');
    expect(cautionsFor(['room']).map((caution) => caution.id)).toContain('openings-and-glass');
  });

  it('are what the contract for listing them takes', () => {
    for (const caution of CAUTIONS) expect(cautionSchema.parse(caution)).toEqual(caution);
  });

  it('come once each, and not at all for no section', () => {
    expect(cautionsFor(SECTIONS)).toEqual(CAUTIONS);
    expect(cautionsFor(['load', 'load'])).toEqual(cautionsFor(['load']));
    expect(cautionsFor([])).toEqual([]);
  });
});
