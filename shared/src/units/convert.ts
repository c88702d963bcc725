import { findUnit } from './find-unit.ts';
import type { Unit } from './unit-table.ts';

function known(name: string): Unit {
  const unit = findUnit(name);
  if (unit === undefined) throw new RangeError(`No unit is written “${name}”.`);
  return unit;
}

/**
 * A value in another unit of the same dimension. Factors are exact by definition (1 ft = 0.3048 m, 1 lb = 0.45359237 kg,
 * 1 Btu = 1055.05585262 J; NIST SP 811). `K` is a temperature difference, `°C` a temperature: they do not convert into
 * each other. Any finite value; a non-finite one comes back as it is.
 *
 * @throws RangeError when a unit is unknown or the two measure different things
 */
export function convert(value: number, from: string, to: string): number {
  const source = known(from);
  const target = known(to);
  if (source.dimension !== target.dimension) {
    throw new RangeError(`${source.symbol} measures ${source.dimension}, ${target.symbol} ${target.dimension}.`);
  }
  if (source === target) return value;
  return ((value - source.zero) * source.factor) / target.factor + target.zero;
}
