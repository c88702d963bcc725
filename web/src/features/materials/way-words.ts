import type { MaterialWay } from '@embertally/shared/materials/material-draft';

interface WayWords {
  /** As a thing one has: "Runs in a bomb calorimeter". */
  readonly title: string;
  readonly hint: string;
}

/** Where a heat can come from, in the words of somebody who holds a paper in hand. In the order they are offered. */
export const WAY_WORDS: Readonly<Record<MaterialWay, WayWords>> = {
  supplier: {
    title: 'A supplier’s sheet',
    hint: 'A heat of combustion printed by a supplier or a laboratory, net or gross, dry or as delivered.',
  },
  bomb: {
    title: 'Runs in a bomb calorimeter',
    hint: 'Three runs or more with their masses and temperature rises; gross is brought to net.',
  },
  ultimate: {
    title: 'An elementary analysis',
    hint: 'Carbon, hydrogen, oxygen and the rest in percent; a published correlation estimates the heat.',
  },
  formula: {
    title: 'A chemical formula',
    hint: 'A pure substance with its enthalpy of formation from a table.',
  },
  equation: {
    title: 'A thermochemical equation',
    hint: 'A heat printed with an equation, or claimed for one mole.',
  },
  composition: {
    title: 'What it is made of',
    hint: 'Shares of other materials of the catalogue, by mass.',
  },
};
export const WAYS = Object.keys(WAY_WORDS) as readonly MaterialWay[];

export function isWay(text: string | null): text is MaterialWay {
  return text !== null && Object.hasOwn(WAY_WORDS, text);
}
