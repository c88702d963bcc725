import type { CalorimeterChoices } from './calorimeter-choices.ts';
import { perArea } from './column-units.ts';

interface CurveBasis {
  readonly per: 'piece' | 'm2';
  /** As a person reads them. */
  readonly heatUnit: 'MJ' | 'MJ/m²';
  readonly rateUnit: 'kW' | 'kW/m²';
}

/** Whether a curve is of the whole test piece or of its exposed area; a rate worked out from gases is of the piece. */
export function curveBasis({ from, units }: CalorimeterChoices): CurveBasis {
  return from === 'rate' && perArea(units.rate ?? '')
    ? { per: 'm2', heatUnit: 'MJ/m²', rateUnit: 'kW/m²' }
    : { per: 'piece', heatUnit: 'MJ', rateUnit: 'kW' };
}
