import { figure } from '../methods/figure.ts';
import { formatNumber } from '../units/format-number.ts';
import type { MaterialBasis } from './derived-material.ts';
import { receivedHeat } from './received-heat.ts';
import type { WayHeat } from './way-heat.ts';

/** A factor on the stated net heat, with what the material would then have as received, in words. */
export function basisProposal(heat: WayHeat, factor: number): NonNullable<MaterialBasis['proposal']> {
  const net = receivedHeat(heat, heat.net_MJ_kg * factor);
  return {
    factor,
    net_MJ_kg: net,
    text: `Multiplied by ${figure(Number(factor.toPrecision(4)))} it would be ${formatNumber(net, 3)} MJ/kg.`,
  };
}
