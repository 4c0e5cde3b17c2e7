import { transmissionWPerK, ventilationWPerK } from '@/lib/physics/design-heat-load';
import type { HouseRecord } from '@/lib/schemas/house';

/** Where the heat of a house goes [W/K], and what that makes on the design day. */
export interface HouseLoss {
  shares: { name: string; wattsPerK: number }[];
  shellAreaM2: number;
  /** of shell and air as entered, before the bills */
  enteredWPerK: number;
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

/** Sums the shell and the exchange of air of a house, scaled to its bills where that was asked for. */
export function houseLoss(house: HouseRecord): HouseLoss {
  const shares = GROUPS.map(({ name, kinds }) => ({
    name,
    wattsPerK: transmissionWPerK(house.shell.filter(({ kind }) => kinds.includes(kind))),
  }));
  shares.push({ name: 'air', wattsPerK: ventilationWPerK(house.airChangePerH, house.volumeM3) });
  const enteredWPerK = shares.reduce((sum, share) => sum + share.wattsPerK, 0);
  const { factor } = house.calibration;
  const wholeWPerK = factor * enteredWPerK;
  return {
    shares: shares
      .filter(({ wattsPerK }) => wattsPerK > 0)
      .map(({ name, wattsPerK }) => ({ name, wattsPerK: factor * wattsPerK })),
    shellAreaM2: house.shell.reduce((sum, { kind, areaM2 }) => sum + (kind === 'bridge' ? 0 : areaM2), 0),
    enteredWPerK,
    wholeWPerK,
    designW: wholeWPerK * (house.roomSetC - house.designOutdoorC),
  };
}
