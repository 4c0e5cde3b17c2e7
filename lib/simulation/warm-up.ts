import type { SimulationInput, Simulator } from './simulate';

/** Areas of the runs that warm the engine up: each makes the loop see charging, draws, locks and standstill [m²]. */
const WARM_UP_AREAS_M2 = [12, 30, 0] as const;

/**
 * Lets the JavaScript engine compile the loop on all seasons before the first tick of a slider.
 * @param simulator the thread's simulator
 * @param input a design with its house and weather; its area is varied
 */
export function warmUp(simulator: Simulator, input: SimulationInput): void {
  const { design } = input;
  for (const areaM2 of WARM_UP_AREAS_M2) {
    simulator.run({ ...input, design: { ...design, array: { ...design.array, areaM2 } } });
  }
}
