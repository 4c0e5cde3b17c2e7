/** A version of the engine: what moves in results, and by how much. */
export interface EngineChange {
  version: string;
  /** day of the change, ISO 8601 */
  date: string;
  moves: readonly { what: string; byHowMuch: string }[];
}

/** Results that change, the newest version first; the numbers are those of the demonstration's designs. */
export const CHANGES: readonly EngineChange[] = [
  {
    version: '0.2.1',
    date: '2026-12-01',
    moves: [
      {
        what: 'The draw of a hot-water coil counts in the length of a sub-step.',
        byHowMuch: 'Heat by less than 0.005 % with a coil, nothing without one.',
      },
    ],
  },
  {
    version: '0.2.0',
    date: '2026-12-01',
    moves: [
      {
        what: 'Heat that a floor loses downwards counts in the flow of its loop, and emitters cool their water no further than to the room.',
        byHowMuch: 'Solar heat −0.7 to −1.3 %, bought energy +0.8 to +1.1 %, the need without sun +0.4 %.',
      },
      {
        what: 'Radiators see the air of the step before instead of the room without their own heat.',
        byHowMuch:
          'Solar heat to the rooms −0.06 % on the demonstration, −2.2 % with radiators alone at 55 °C.',
      },
      {
        what: 'A pre-period sets the initial state; the year is repeated only when heat is left over.',
        byHowMuch: 'Solar heat −0.03 %, bought energy +0.05 %.',
      },
      {
        what: 'A sub-step ends when the heating draw has brought the top of the store down to its return.',
        byHowMuch:
          'Nothing on the demonstration; small stores with large draws by less than the step’s own error.',
      },
      {
        what: 'New effects: layouts with a vessel or straight to the slab, coil, pump curve, skyline, rows, two-axis modifiers, a second field, night setback, heat pump.',
        byHowMuch: 'Nothing while they are not asked for.',
      },
    ],
  },
  {
    version: '0.1.0',
    date: '2026-12-01',
    moves: [{ what: 'The first version.', byHowMuch: 'Nothing to compare with.' }],
  },
];
