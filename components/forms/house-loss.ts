import { transmissionWPerK, ventilationWPerK } from '@/lib/physics/design-heat-load';
import type { HouseRecord } from '@/lib/schemas/house';

/** Where the heat of a house goes [W/K], and what that makes on the design day. */
export interface HouseLoss {
  shares: { name: string; wattsPerK: number }[];
  shellAreaM2: number;
  wholeWPerK: number;
  designW: number;
}

const GROUPS: { name: string; kinds: readonly HouseRecord['shell'][number]['kind'][] }[] = [
  { name: 'walls', kinds: ['wall', 'door'] },
  { name: 'roof', kinds: ['roof'] },
  { name: 'windows', kinds: ['window'] },
  { name: 'floor', kinds: ['ground'] },
  { name: 'bridges', kinds: ['bridge'] },
];

/** Sums the shell and the exchange of air of a house. */
export function houseLoss(house: HouseRecord): HouseLoss {
  const shares = GROUPS.map(({ name, kinds }) => ({
    name,
    wattsPerK: transmissionWPerK(house.shell.filter(({ kind }) => kinds.includes(kind))),
  }));
  shares.push({ name: 'air', wattsPerK: ventilationWPerK(house.airChangePerH, house.volumeM3) });
  const wholeWPerK = shares.reduce((sum, share) => sum + share.wattsPerK, 0);
  return {
    shares: shares.filter(({ wattsPerK }) => wattsPerK > 0),
    shellAreaM2: house.shell.reduce((sum, { kind, areaM2 }) => sum + (kind === 'bridge' ? 0 : areaM2), 0),
    wholeWPerK,
    designW: wholeWPerK * (house.roomSetC - house.designOutdoorC),
  };
}
