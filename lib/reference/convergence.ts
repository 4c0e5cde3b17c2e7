import type { EnergyBalance, YearResult } from '@/lib/simulation/results';
import type { SimulationInput, Simulator } from '@/lib/simulation/simulate';

/** One year of a design with another step or another number of layers. */
export interface ConvergenceYear {
  design: string;
  /** θ [-] and number of layers of this year */
  theta: number;
  layers: number;
  solarKwh: number;
  boughtKwh: number;
  subSteps: number;
  residualShare: number;
  /** solar heat against the year with which this one is to be compared [-] */
  difference: number;
  varied: 'step' | 'layers';
}

/** Energy balance of a year as the product works it. */
export interface BalanceOfDesign {
  design: string;
  balance: EnergyBalance;
}

/** θ of the steps: the product's own, the accurate one, and the yardstick. */
export const THETAS = [0.5, 0.25, 0.125] as const;
export const LAYERS = [5, 8, 10, 12] as const;

export interface ConvergenceSubject {
  design: string;
  input: SimulationInput;
}

function yearOf(simulator: Simulator, input: SimulationInput): YearResult {
  const outcome = simulator.run(input);
  if (!outcome.ok) throw new Error(outcome.message);
  return outcome.result;
}

function withNumerics(input: SimulationInput, theta: number, layers: number): SimulationInput {
  const store = { ...input.design.store, layers };
  return { ...input, design: { ...input.design, store }, numerics: { ...input.numerics, theta } };
}

/**
 * Works the year of a design with finer steps and with other numbers of layers.
 * @param simulator engine
 * @param subject design with its house and weather
 * @returns the years: steps against the finest, layers against the design's own number [kWh, -]
 * @see own definition: the model's own convergence, not an outside check
 */
export function convergence(simulator: Simulator, subject: ConvergenceSubject): ConvergenceYear[] {
  const { design, input } = subject;
  const ownTheta = input.numerics.theta;
  const ownLayers = input.design.store.layers;
  const solar = ({ year }: YearResult) => year.solarHeatingKwh + year.solarTapKwh;
  const work = (theta: number, layers: number) => yearOf(simulator, withNumerics(input, theta, layers));
  const finest = solar(work(Math.min(...THETAS), ownLayers));
  const own = solar(work(ownTheta, ownLayers));
  const line = (theta: number, layers: number, against: number, varied: ConvergenceYear['varied']) => {
    const result = work(theta, layers);
    return {
      design,
      theta,
      layers,
      solarKwh: solar(result),
      boughtKwh: result.year.boughtKwh,
      subSteps: result.subSteps,
      residualShare: result.balance.residualShare,
      difference: against > 0 ? solar(result) / against - 1 : 0,
      varied,
    };
  };
  return [
    ...THETAS.map((theta) => line(theta, ownLayers, finest, 'step')),
    ...LAYERS.map((layers) => line(ownTheta, layers, own, 'layers')),
  ];
}

/** The energy balance of a design's year. */
export function balanceOf(simulator: Simulator, subject: ConvergenceSubject): BalanceOfDesign {
  return { design: subject.design, balance: yearOf(simulator, subject.input).balance };
}
