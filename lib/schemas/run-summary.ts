import type { EnergyRow, PartDryness, YearTotals } from '@/lib/simulation/results';

/** Totals as some engine stored them: what the first version had is always there, later fields may be missing. */
export type StoredYear = EnergyRow & Pick<YearTotals, 'fractions' | 'overLimitHours'> & Partial<YearTotals>;

/** The year of a stored run in figures, without its hours. */
export interface RunSummary {
  engineVersion: string;
  /** SHA-256 of the house, the design, the numerics and the weather that it stands for */
  inputsHash: string;
  createdAt: string;
  /** false when an input or the engine has changed since */
  current: boolean;
  /** false when another version of the engine worked it */
  currentEngine: boolean;
  year: StoredYear;
  dryParts: PartDryness[];
}
