import { netAsReceived } from '../methods/heat/net-as-received.ts';
import type { WayHeat } from './way-heat.ts';

/** A net heat on the way's own basis as net, as received; below 0 where water takes more than there is. */
export function receivedHeat({ state, water }: Pick<WayHeat, 'state' | 'water'>, net: number): number {
  return state === 'received' || water === null || water === 0 ? net : netAsReceived.run({ H_dry: net, w: water });
}
