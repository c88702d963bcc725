import { netAsReceived } from '../methods/heat/net-as-received.ts';
import { formatNumber } from '../units/format-number.ts';
import { basisProposal } from './basis-proposal.ts';
import type { MaterialBasis } from './derived-material.ts';
import type { Expectation, WayHeat } from './way-heat.ts';

/** A stated heat this near to what is expected is left alone. */
const NEAR = 0.04;
/** Another basis explains a heat when it fits this well … */
const FITS = 0.03;
/** … and at least so many times better than the stated one. */
const BETTER = 2;

/**
 * Holds a stated net heat against what is expected of the material on the basis it claims, and on the two it may really be
 * on: gross instead of net, dry instead of as received. Null without an expectation or with a plausible heat.
 */
export function compareHeat(heat: WayHeat): Omit<MaterialBasis, 'perOxygen_MJ_kg' | 'accepted'> | null {
  const { expectation, net_MJ_kg: stated } = heat;
  if (expectation === undefined || heat.gross_MJ_kg !== null) return null;
  const water = heat.water ?? 0;
  const here = (dry: number) =>
    heat.state === 'received' ? Math.max(0, netAsReceived.run({ H_dry: dry, w: water })) : dry;
  const expected = here(expectation.net);
  const gap = away(stated, expected);
  if (gap <= NEAR) return null;
  const candidates = [
    ...(heat.state === 'received' && water > 0 ? [dryForReceived(heat, expectation, water)] : []),
    ...(expectation.gross === null
      ? []
      : [
          grossForNet(
            heat,
            expectation.name,
            expected,
            heat.state === 'received' ? expectation.gross * (1 - water) : expectation.gross,
          ),
        ]),
  ];
  const best = candidates.filter(({ miss }) => miss <= FITS && miss * BETTER <= gap).sort((a, b) => a.miss - b.miss)[0];
  return best?.finding ?? null;
}

const away = (value: number, target: number): number => Math.abs(value / target - 1);

function dryForReceived(heat: WayHeat, { name, net }: Expectation, water: number) {
  const factor = netAsReceived.run({ H_dry: heat.net_MJ_kg, w: water }) / heat.net_MJ_kg;
  return {
    miss: away(heat.net_MJ_kg, net),
    finding: finding(
      heat,
      'dry-for-received',
      factor,
      `By ${name} this looks like the heat of the dry material, but it is stated as received with ${formatNumber(100 * water, 3)} % water.`,
    ),
  };
}

function grossForNet(heat: WayHeat, name: string, net: number, gross: number) {
  return {
    miss: away(heat.net_MJ_kg, gross),
    finding: finding(
      heat,
      'gross-for-net',
      net / gross,
      `By ${name} this looks like the gross heat, but it is stated as net.`,
    ),
  };
}

function finding(heat: WayHeat, kind: 'dry-for-received' | 'gross-for-net', factor: number, text: string) {
  return {
    finding: kind,
    text: `${text} Ask the supplier which it is.`,
    proposal: basisProposal(heat, factor),
  };
}
