import { STEFAN_BOLTZMANN, toCelsius, toKelvin } from '@/lib/units/constants';
import { gapConvection, gapTilt } from './gap-convection';
import { longwaveFactors } from './longwave-exchange';

export interface TopLossInput {
  /** mean plate temperature [°C] */
  plateC: number;
  airC: number;
  skyC: number;
  gapM: number;
  tiltDeg: number;
  plateEmittance: number;
  coverEmittance: number;
  /** long-wave transmittance of the cover, 0 for glass [-] */
  coverLongwaveTransmittance: number;
  /** convection from cover to wind [W/(m²K)] */
  windWPerM2K: number;
}

const BISECTIONS = 60;

/**
 * Top loss of a plate under one cover: the cover temperature at which the heat that comes up through the gap
 * leaves to sky and wind, found by bisection; Ut = total upward heat/(Tp − Ta).
 * @param input temperatures [°C], gap [m], emittances [-], wind coefficient [W/(m²K)]
 * @returns { lossWPerM2K [W/(m²K)], coverC [°C] }
 * @see Duffie & Beckman, Solar Engineering of Thermal Processes, 4th ed. 2013, sec. 6.4, Example 6.4.1
 */
export function topLoss(input: TopLossInput): { lossWPerM2K: number; coverC: number } {
  const factors = longwaveFactors(
    input.plateEmittance,
    input.coverEmittance,
    input.coverLongwaveTransmittance,
  );
  const tilt = gapTilt(input.tiltDeg);
  const plateK = toKelvin(input.plateC);
  const airK = toKelvin(input.airC);
  const skyK = toKelvin(input.skyC);
  const emission = (kelvin: number) => STEFAN_BOLTZMANN * kelvin ** 4;
  const up = (coverK: number) =>
    gapConvection(plateK, coverK, input.gapM, tilt) * (plateK - coverK) +
    factors.plateToCover * (emission(plateK) - emission(coverK));
  const out = (coverK: number) =>
    input.windWPerM2K * (coverK - airK) + factors.coverToSky * (emission(coverK) - emission(skyK));

  let low = Math.min(skyK, airK, plateK);
  let high = Math.max(skyK, airK, plateK);
  for (let i = 0; i < BISECTIONS; i++) {
    const middle = (low + high) / 2;
    if (up(middle) > out(middle)) low = middle;
    else high = middle;
  }
  const coverK = (low + high) / 2;
  const through = factors.plateToSky * (emission(plateK) - emission(skyK));
  return { lossWPerM2K: (up(coverK) + through) / (plateK - airK), coverC: toCelsius(coverK) };
}

/**
 * Top loss in closed form (Klein 1979):
 * Ut = (N/((C/Tp)((Tp − Ta)/(N + f))^e) + 1/hw)⁻¹ + σ(Tp + Ta)(Tp² + Ta²)/((εp + 0.00591 N hw)⁻¹ + (2N + f − 1 + 0.133 εp)/εg − N).
 * @param plateC mean plate temperature [°C] air temperature to 200
 * @param airC air temperature [°C]
 * @param tiltDeg tilt [°] 0–70, held at 70 above
 * @param windWPerM2K convection from cover to wind hw [W/(m²K)]
 * @param plateEmittance εp [-] 0.05–1
 * @param coverEmittance εg [-] 0.8–0.95
 * @param covers number of glass covers N [-] 1–3
 * @returns top loss Ut [W/(m²K)], within ±0.3 of the iterative calculation
 * @see Klein, Solar Energy 23 (1979) 271; Duffie & Beckman, 4th ed. 2013, eq. 6.4.9
 */
export function kleinTopLoss(
  plateC: number,
  airC: number,
  tiltDeg: number,
  windWPerM2K: number,
  plateEmittance: number,
  coverEmittance: number,
  covers: number,
): number {
  const plateK = toKelvin(plateC);
  const airK = toKelvin(airC);
  const f = (1 + 0.089 * windWPerM2K - 0.1166 * windWPerM2K * plateEmittance) * (1 + 0.07866 * covers);
  const c = 520 * (1 - 0.000051 * Math.min(tiltDeg, 70) ** 2);
  const e = 0.43 * (1 - 100 / plateK);
  const convection = 1 / (covers / ((c / plateK) * ((plateK - airK) / (covers + f)) ** e) + 1 / windWPerM2K);
  const radiation =
    (STEFAN_BOLTZMANN * (plateK + airK) * (plateK ** 2 + airK ** 2)) /
    (1 / (plateEmittance + 0.00591 * covers * windWPerM2K) +
      (2 * covers + f - 1 + 0.133 * plateEmittance) / coverEmittance -
      covers);
  return convection + radiation;
}
