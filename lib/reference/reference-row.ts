/** How the outside value of a check is known. */
export type Provenance = 'read' | 'from memory' | 'derived' | 'common practice';

/** One check of the product against an outside value. The runner computes, compares and prints the source. */
export interface ReferenceRow {
  id: string;
  title: string;
  source: string;
  provenance: Provenance;
  /** A published output read, B published output from memory, C computed from the cited equation */
  tier: 'A' | 'B' | 'C';
  expected: Record<string, number>;
  tolerance: number | Record<string, number>;
  /** tolerance is a fraction of the expected value instead of absolute */
  relative?: boolean;
  /** calls the product's own function: a row never carries its own copy of a formula */
  compute: () => Record<string, number>;
}
