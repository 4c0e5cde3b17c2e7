import { builtFields } from '@/lib/simulation/built-fields';
import type { CheckSubject } from './findings';

/** An input and the range in which the equation that reads it was established. */
export interface EquationRange {
  name: string;
  unit: string;
  low: number;
  high: number;
  equation: string;
  /** the value, or undefined where the equation is not used */
  value: (subject: CheckSubject) => number | undefined;
}

/** Inputs that the forms allow beyond the range of the equation behind them. */
export const EQUATION_RANGES: readonly EquationRange[] = [
  {
    name: 'screed over the pipes',
    unit: 'mm',
    low: 30,
    high: 80,
    equation: 'EN 1264-2, type A',
    value: ({ house }) => (house.emitters.floor.areaM2 > 0 ? house.emitters.floor.screedMm : undefined),
  },
  {
    name: 'screed conductivity',
    unit: 'W/(m K)',
    low: 0.8,
    high: 2,
    equation: 'EN 1264-2, type A',
    value: ({ house }) =>
      house.emitters.floor.areaM2 > 0 ? house.emitters.floor.screedConductivity : undefined,
  },
  {
    name: 'tilt of the empty collector',
    unit: '°',
    low: 0,
    high: 75,
    equation: 'Hollands et al. 1976, gap convection (its value at 75° is held)',
    value: ({ design }) => {
      const balanced = builtFields(design).filter(({ collector }) => collector.dry.kind === 'balance');
      return balanced.length > 0 ? Math.max(...balanced.map(({ array }) => array.tiltDeg)) : undefined;
    },
  },
  {
    name: 'radiator exponent',
    unit: '',
    low: 1,
    high: 1.4,
    equation: 'EN 442-2, characteristic equation',
    value: ({ house }) =>
      house.emitters.radiators.ratedW > 0 ? house.emitters.radiators.exponent : undefined,
  },
];
