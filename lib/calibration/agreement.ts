/** How well a model agrees with measured energies. */
export interface Agreement {
  /** normalised mean bias error, measured less modelled [-] */
  nmbe: number;
  /** coefficient of variation of the root mean square error [-] */
  cvRmse: number;
}

/** Limits for monthly data [-]. */
export const MONTHLY_NMBE_LIMIT = 0.05;
export const MONTHLY_CV_RMSE_LIMIT = 0.15;

/**
 * NMBE = Σ(m − s)/((n − p) m̄), CV(RMSE) = √(Σ(m − s)²/(n − p))/m̄.
 * @param measured m of each interval [kWh]
 * @param modelled s of each interval [kWh]
 * @param parameters p: numbers fitted to these data [-]; 1 for a simulation
 * @returns both errors [-]
 * @remarks not a number with no more intervals than parameters
 * @see ASHRAE Guideline 14-2014, 5.2.11 (from memory): for monthly data a calibrated model keeps ±5 % and 15 %
 */
export function agreement(
  measured: ArrayLike<number>,
  modelled: ArrayLike<number>,
  parameters: number,
): Agreement {
  const n = measured.length;
  let sum = 0;
  let bias = 0;
  let squares = 0;
  for (let i = 0; i < n; i++) {
    const residual = measured[i]! - modelled[i]!;
    sum += measured[i]!;
    bias += residual;
    squares += residual * residual;
  }
  const freedom = n > parameters ? n - parameters : NaN;
  const mean = sum / n;
  return { nmbe: bias / (freedom * mean), cvRmse: Math.sqrt(squares / freedom) / mean };
}

/**
 * Whether a model may be called calibrated by monthly data.
 * @param found errors [-]
 * @returns true within both limits
 * @see ASHRAE Guideline 14-2014, 5.3.2.4 (from memory)
 */
export function isCalibrated(found: Agreement): boolean {
  return Math.abs(found.nmbe) <= MONTHLY_NMBE_LIMIT && found.cvRmse <= MONTHLY_CV_RMSE_LIMIT;
}
