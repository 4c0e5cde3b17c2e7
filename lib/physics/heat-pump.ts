import { toKelvin } from '@/lib/units/constants';

/**
 * Coefficient of performance as a share of Carnot's: COP = η Th/(Th − Tc).
 * @param sourceC temperature of the source Tc [°C]
 * @param supplyC temperature of the supply Th [°C] above the source
 * @param carnotShare η [-] 0.3–0.55
 * @param greatest bound where both temperatures meet [-]
 * @returns COP [-]
 * @see Carnot's theorem; share 0.45 is common practice, no source
 */
export function heatPumpCop(sourceC: number, supplyC: number, carnotShare = 0.45, greatest = 8): number {
  const liftK = supplyC - sourceC;
  return liftK > 0 ? Math.min(greatest, (carnotShare * toKelvin(supplyC)) / liftK) : greatest;
}
