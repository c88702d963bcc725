/** The sections of a tally, as its fields are named. */
export type TallySection = 'load' | 'growth' | 'room' | 'burnout' | 'response' | 'spread' | 'air' | 'limits';

export interface Caution {
  readonly id: string;
  readonly title: string;
  readonly text: string;
}

/**
 * The safety notices that stand with results on screen, in prints and in exports. Each defers to the local fire code, the
 * authority having jurisdiction (the body that applies the code there) and licensed practice. A text may become clearer;
 * its facts and its id stay.
 */
export const CAUTIONS: readonly Caution[] = [
  {
    id: 'planning-figures',
    title: 'Figures for planning, not permission',
    text:
      'These numbers help people look, compare and ask. They approve no use, no layout and no stock: ' +
      'that is for the local fire code, the authority having jurisdiction and licensed practice.',
  },
  {
    id: 'qualified-person',
    title: 'A qualified person decides',
    text:
      'Fire protection is designed, accepted and changed by a person in licensed practice where the building stands, ' +
      'under the local fire code and the authority having jurisdiction. ' +
      'Show that person the workings, not the result alone.',
  },
  {
    id: 'closed-room',
    title: 'The room is taken as closed in by construction that holds',
    text:
      'Where doors stand open, walls have no fire rating, or ceilings and ducts join rooms, the fire is bigger than one ' +
      'room’s page shows. What must separate rooms, and whether it does, is for the local fire code, ' +
      'the authority having jurisdiction and licensed practice to say.',
  },
  {
    id: 'design-load',
    title: 'The design load is not the heat that is there',
    text:
      'It is the kept load multiplied by factors for alarms, sprinklers and fire brigades (EN 1991-1-2:2002, Annex E). ' +
      'The local fire code, the authority having jurisdiction and licensed practice decide whether they may be used; ' +
      'your code may not allow them. Systems fail and are switched off: read the load as kept first.',
  },
  {
    id: 'openings-and-glass',
    title: 'What openings and glass will do is assumed',
    text:
      'When a window breaks or a door is opened, the fire changes at once. A nearly closed room can flare up when it is ' +
      'opened; no number here covers that. Which openings may be counted on is for the local fire code, ' +
      'the authority having jurisdiction and licensed practice.',
  },
  {
    id: 'order-and-gaps',
    title: 'The order of ignition and the gaps are rough',
    text:
      'They come from simple sums of radiation in still air. Nothing falls, melts or is carried by a draught in them. ' +
      'A gap that would do on paper is no barrier, and no substitute for the separation that the local fire code, ' +
      'the authority having jurisdiction and licensed practice ask for.',
  },
  {
    id: 'unusual-goods',
    title: 'Some goods do not behave like their megajoules',
    text:
      'Gas cylinders, aerosols, batteries, dusts, oxidisers, goods that react with water and smouldering heaps can harm ' +
      'out of all proportion to their heat. Ask a specialist and tell the fire service; how they may be kept is for ' +
      'the local fire code, the authority having jurisdiction and licensed practice.',
  },
  {
    id: 'survey-ages',
    title: 'A survey ages from the day it is made',
    text:
      'Amounts were counted or estimated on a date, with the uncertainty that is shown. When stock, layout, protection or ' +
      'use changes, survey again before you rely on it; what else a change asks for is set by the local fire code, ' +
      'the authority having jurisdiction and licensed practice. ' +
      'In a fire, leave and call the fire service: these pages give no tactics and promise no time to escape.',
  },
];

const EVERY_SECTION: readonly TallySection[] = [
  'load',
  'growth',
  'room',
  'burnout',
  'response',
  'spread',
  'air',
  'limits',
];

/** The sections whose numbers each caution stands with. */
const STANDS_WITH: Readonly<Record<string, readonly TallySection[]>> = {
  'planning-figures': EVERY_SECTION,
  'qualified-person': EVERY_SECTION,
  'closed-room': ['growth', 'room', 'burnout', 'response', 'spread', 'air'],
  'design-load': ['load', 'burnout', 'limits'],
  'openings-and-glass': ['growth', 'room', 'burnout', 'response', 'spread', 'air'],
  'order-and-gaps': ['spread'],
  'unusual-goods': ['load', 'growth', 'spread', 'air', 'limits'],
  'survey-ages': EVERY_SECTION,
};

/** The cautions that stand with these sections of a tally, in their fixed order, each once. None for no section. */
export function cautionsFor(sections: readonly TallySection[]): readonly Caution[] {
  return CAUTIONS.filter((caution) => STANDS_WITH[caution.id]?.some((section) => sections.includes(section)));
}
