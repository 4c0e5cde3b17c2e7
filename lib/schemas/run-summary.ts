import type { PartDryness, YearTotals } from '@/lib/simulation/results';

/** The year of a stored run in figures, without its hours. */
export interface RunSummary {
  engineVersion: string;
  /** SHA-256 of the house, the design, the numerics and the weather that it stands for */
  inputsHash: string;
  createdAt: string;
  /** false when an input or the engine has changed since */
  current: boolean;
  year: YearTotals;
  dryParts: PartDryness[];
}
