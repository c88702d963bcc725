import { convert } from '@embertally/shared/units/convert';
import { displayUnit } from '@embertally/shared/units/display-unit';
import { formatNumber } from '@embertally/shared/units/format-number';
import type { UnitSystem } from '@embertally/shared/units/unit-system';

interface PowerUnit {
  readonly symbol: string;
  readonly of: (kW: number) => number;
  readonly text: (kW: number) => string;
}

/** Large fires are read in MW, small ones in kW; in US customary units in Btu/s. */
export function powerUnit(peak_kW: number, system: UnitSystem): PowerUnit {
  const unit =
    system === 'SI' && peak_kW >= 1000
      ? { key: 'MW', symbol: 'MW' }
      : (displayUnit('kW', system) ?? { key: 'kW', symbol: 'kW' });
  const of = (kW: number): number => convert(kW, 'kW', unit.key);
  return { symbol: unit.symbol, of, text: (kW) => `${formatNumber(of(kW), 3)} ${unit.symbol}` };
}
