/** A version of the engine: what moves in results, and by how much. */
export interface EngineChange {
  version: string;
  /** day of the change, ISO 8601 */
  date: string;
  moves: readonly { what: string; byHowMuch: string }[];
}

/**
 * Results that change, the newest version first. The middle number rises when results move by choice or by a new
 * effect, the last when a fault is mended, the first when old results can no longer be compared.
 */
export const CHANGES: readonly EngineChange[] = [
  {
    version: '0.1.0',
    date: '2026-12-01',
    moves: [{ what: 'The first version.', byHowMuch: 'Nothing to compare with.' }],
  },
];
