import { netFromCondensate } from '../../methods/calorimetry/net-from-condensate.ts';
import { netOfFormula } from '../../methods/chemistry/net-of-formula.ts';
import { netFromGross } from '../../methods/heat/net-from-gross.ts';
import { formatNumber } from '../../units/format-number.ts';
import { waterHydrogen, type Composition } from '../composition.ts';
import { DraftRefused } from '../draft-refused.ts';
import type { DraftOf } from '../material-draft.ts';
import type { Workbook } from '../workbook.ts';

/**
 * Net heat of the dry sample from its gross heat, by what the draft says of its hydrogen.
 * @param water share of water in the sample when it was burnt, kg/kg
 */
export function bombNet(
  book: Workbook,
  draft: DraftOf<'bomb'>,
  gross: number,
  water: number,
  composition: Composition | null,
): number {
  const { hydrogen } = draft;
  switch (hydrogen.by) {
    case 'content':
      return book.run(
        netFromGross,
        { H_gross: gross, w_H: hydrogen.hydrogen_pct / 100 },
        { at: '/hydrogen/hydrogen_pct' },
        { origins: { w_H: 'measured' } },
      );
    case 'condensate': {
      const formed = (hydrogen.water_kg_kg - water) / (1 - water);
      if (formed < 0)
        throw DraftRefused.at(
          '/hydrogen/water_kg_kg',
          'too_little_water',
          `The sample alone held ${formatNumber(water, 3)} kg of water per kg; the condensate cannot be less. Check both.`,
        );
      return book.run(
        netFromCondensate,
        { PCS: gross, w: formed },
        { at: '/hydrogen/water_kg_kg' },
        {
          origins: { w: 'measured' },
          steps:
            water > 0
              ? [
                  {
                    text: 'Water formed per dry kg: condensate less the sample’s own water',
                    value: formed,
                    unit: 'kg/kg',
                  },
                ]
              : [],
        },
      );
    }
    case 'formula': {
      if (composition?.by !== 'formula')
        throw DraftRefused.at('/formula', 'missing', 'Write the formula: hydrogen is to be taken from it.');
      const { net } = book.outputs(netOfFormula, { ...composition.atoms, gross }, { at: '/formula' }, ['net']);
      return net;
    }
    case 'elements': {
      if (draft.elements === undefined || composition === null)
        throw DraftRefused.at('/elements', 'missing', 'Enter the analysis: hydrogen is to be taken from it.');
      return book.run(
        netFromGross,
        { H_gross: gross, w_H: waterHydrogen(composition) },
        { at: '/elements/hydrogen_pct' },
        { origins: { w_H: 'measured' } },
      );
    }
  }
}
