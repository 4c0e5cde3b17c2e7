import { createRequire } from 'node:module';

/** The part of the library odex that is used here. */
interface OdexSolver {
  relativeTolerance: number;
  absoluteTolerance: number;
  initialStepSize: number;
  solve(
    rates: (x: number, y: number[]) => number[],
    from: number,
    start: number[],
    to: number,
  ): { y: number[]; outcome: number };
}

// Asked for by name at run time: its sources, which the compiler would read instead, do not pass strict checks.
const { Solver } = createRequire(import.meta.url)('odex') as { Solver: new (size: number) => OdexSolver };

const TOLERANCE = 1e-9;
const CONVERGED = 0;

/**
 * Integrates y' = f(x, y) from 0 by the Gragg-Bulirsch-Stoer method with relative and absolute tolerances of 1e-9.
 * @throws when the library does not converge
 */
export function integrate(
  rates: (x: number, y: number[]) => number[],
  start: readonly number[],
  length: number,
): number[] {
  const solver = new Solver(start.length);
  solver.relativeTolerance = solver.absoluteTolerance = TOLERANCE;
  solver.initialStepSize = length;
  const { y, outcome } = solver.solve(rates, 0, start.slice(), length);
  if (outcome !== CONVERGED) throw new Error(`odex ended with outcome ${outcome}`);
  return y;
}
