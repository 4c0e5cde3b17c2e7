import { L_PER_M3, MM_PER_M } from '@/lib/units/constants';

/**
 * Loss of an insulated pipe per metre: U' = π/(ln(D/d)/(2λ) + 1/(h D)).
 * @param pipeDiameterM outer diameter of the pipe d [m] above 0
 * @param insulationM thickness of the insulation [m] from 0
 * @param conductivity λ of the insulation [W/(m K)] 0.02–0.1
 * @param outerFilmWPerM2K h at the outside [W/(m²K)] 5–25; 10 indoors
 * @returns loss [W/(m K)]
 * @see ISO 12241:2008, 4.1.2 (from memory)
 */
export function pipeLossWPerMK(
  pipeDiameterM: number,
  insulationM: number,
  conductivity: number,
  outerFilmWPerM2K: number,
): number {
  const outer = pipeDiameterM + 2 * insulationM;
  const insulation = Math.log(outer / pipeDiameterM) / (2 * conductivity);
  return Math.PI / (insulation + 1 / (outerFilmWPerM2K * outer));
}

/**
 * Temperature at the end of a pipe: T = Ta + (Tin − Ta) e^(−U'L/(ṁ cp)).
 * @param inletC temperature at the entry [°C]
 * @param roomC temperature around the pipe [°C]
 * @param lossWPerK U'L of the pipe [W/K] from 0
 * @param capacityFlowWPerK ṁ cp [W/K] above 0
 * @returns temperature at the end [°C]
 * @see steady energy balance along the pipe; ISO 12241:2008, 4.2 (from memory)
 */
export function pipeOutletC(
  inletC: number,
  roomC: number,
  lossWPerK: number,
  capacityFlowWPerK: number,
): number {
  return roomC + (inletC - roomC) * Math.exp(-lossWPerK / capacityFlowWPerK);
}

/**
 * A collector with its pipes as one collector: (τα)'/(τα) = 1/(1 + Ud/C),
 * UL'/UL = (1 − Ui/C + (Ui + Ud)/(A FR UL))/(1 + Ud/C).
 * @param outwardLossWPerK Ui = U·A of the pipe to the collector [W/K] from 0
 * @param returnLossWPerK Ud = U·A of the pipe from the collector [W/K] from 0
 * @param capacityFlowWPerK C = ṁ cp [W/K] above 0
 * @param collectorLossWPerK A FR UL [W/K] above 0
 * @returns factors { tauAlpha, loss } [-]
 * @see Beckman, Solar Energy 21 (1978) 531; Duffie & Beckman, 4th ed. 2013, eq. 10.3.8–10.3.9
 */
export function pipeLossFactors(
  outwardLossWPerK: number,
  returnLossWPerK: number,
  capacityFlowWPerK: number,
  collectorLossWPerK: number,
): { tauAlpha: number; loss: number } {
  const back = 1 + returnLossWPerK / capacityFlowWPerK;
  const out =
    1 - outwardLossWPerK / capacityFlowWPerK + (outwardLossWPerK + returnLossWPerK) / collectorLossWPerK;
  return { tauAlpha: 1 / back, loss: out / back };
}

/**
 * Water held by a metre of pipe: π d²/4.
 * @param boreMm inner diameter [mm] above 0
 * @returns content [L/m]
 * @see geometry; own definition
 */
export function pipeContentLPerM(boreMm: number): number {
  return (Math.PI * (boreMm / MM_PER_M) ** 2 * L_PER_M3) / 4;
}
