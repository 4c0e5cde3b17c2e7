import { toKelvin } from '@/lib/units/constants';

const GAS_CONSTANT_J_PER_MOL_K = 8.314462618;
const J_PER_KJ = 1000;

/**
 * How much faster a material ages than at a reference temperature: exp[(Ea/R)(1/Tref − 1/T)].
 * @param activationKjPerMol activation energy [kJ/mol] 40–150
 * @param temperatureC temperature of the material [°C]
 * @param referenceC temperature of rate 1 [°C]
 * @returns factor on the rate [-]
 * @remarks softening is another thing: it has a limit, not a rate. Carry a range of activation energies (60–120)
 * @see Arrhenius law; activation energy of PVC: Polymer Degradation and Stability 22 (1988) 31
 */
export function arrheniusFactor(
  activationKjPerMol: number,
  temperatureC: number,
  referenceC: number,
): number {
  return Math.exp(
    ((activationKjPerMol * J_PER_KJ) / GAS_CONSTANT_J_PER_MOL_K) *
      (1 / toKelvin(referenceC) - 1 / toKelvin(temperatureC)),
  );
}

/**
 * Activation energy that multiplies the rate by a factor between two temperatures: Ea = R ln f/(1/T1 − 1/T2).
 * @param factor of the rates [-] above 0
 * @param lowC lower temperature [°C]
 * @param highC higher temperature [°C]
 * @returns activation energy [kJ/mol]
 * @see Arrhenius law
 */
export function activationEnergy(factor: number, lowC: number, highC: number): number {
  return (
    (GAS_CONSTANT_J_PER_MOL_K * Math.log(factor)) / (1 / toKelvin(lowC) - 1 / toKelvin(highC)) / J_PER_KJ
  );
}

/**
 * Rule of ten: the rate times Q10 for every 10 K.
 * @param q10 factor per 10 K [-] 1.5–4, 2 by habit
 * @param temperatureC temperature of the material [°C]
 * @param referenceC temperature of rate 1 [°C]
 * @returns factor on the rate [-]
 * @remarks extrapolating hot tests downwards with it is optimistic (Thermochimica Acta 367–368, 2001)
 * @see ASTM F1980, accelerated ageing factor
 */
export function ruleOfTenFactor(q10: number, temperatureC: number, referenceC: number): number {
  return q10 ** ((temperatureC - referenceC) / 10);
}
