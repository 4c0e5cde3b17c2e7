import type { MaterialLimit } from '@/lib/physics/material-limits';

const PANEL = 'screening limits of the trade, to be replaced by the data sheet of the material in hand';
const LEXICON = 'trade lexicon of plastics: lasting/short-time service temperatures';
const DURABILITY = 'trade table of plastics: at least half of a property left after 10,000–20,000 h';

/**
 * Screening limits of collector materials. Every figure stands for a whole class of materials and may be replaced
 * by the user's own; judged at the low end because the sources differ by 10–20 K.
 */
export const MATERIAL_LIMITS: readonly MaterialLimit[] = [
  // prettier-ignore
  ...([
    ['eps', 'expanded polystyrene (EPS)', 75, 80, 85, 95, PANEL, 'from memory'],
    ['xps', 'extruded polystyrene (XPS)', 74, 75, 85, 85, 'EN 13164 data sheet (−50/+75 °C); ASTM C578 type XIII 73.9 °C; short term from memory', 'read'],
    ['pur', 'polyurethane foam (PUR)', 100, 100, 120, 120, PANEL, 'from memory'],
    ['pir', 'polyisocyanurate foam (PIR)', 100, 110, 120, 140, PANEL, 'from memory'],
    ['mineral-wool', 'mineral wool (binder smells from 150 °C)', 150, 200, 200, 250, PANEL, 'from memory'],
    ['pvc-soft', 'soft PVC', 60, 60, 80, 80, PANEL, 'from memory'],
    ['pvc-rigid', 'rigid PVC', 60, 80, 75, 100, `${LEXICON}; ${DURABILITY} (60)`, 'read'],
    ['pe-hd', 'polyethylene, high density (HDPE)', 70, 80, 90, 110, `${LEXICON}; ${DURABILITY} (75)`, 'read'],
    ['pe-film', 'polyethylene film', 55, 80, 75, 110, PANEL, 'from memory'],
    ['pp', 'polypropylene (PP)', 85, 100, 110, 130, `${LEXICON} (100/130); low end from memory`, 'read'],
    ['epdm', 'EPDM mat', 110, 120, 140, 140, `${LEXICON} (120/140); low end from the trade of lined stores`, 'read'],
    ['silicone', 'silicone', 180, 180, 200, 200, LEXICON, 'read'],
    ['pc', 'polycarbonate sheet (PC)', 115, 135, 125, 135, `${DURABILITY} (135); 115–120 from memory`, 'read'],
    ['pmma', 'acrylic sheet (PMMA)', 75, 90, 90, 100, `${LEXICON} (80/100); ${DURABILITY} (90)`, 'read'],
    ['petg', 'PET-G sheet', 70, 70, 80, 80, `${DURABILITY} (70); short term from memory`, 'read'],
    ['etfe', 'ETFE film', 150, 150, 165, 165, PANEL, 'from memory'],
    ['pex', 'cross-linked polyethylene pipe (PEX)', 70, 70, 95, 95, PANEL, 'from memory'],
    ['wood', 'wood (low-temperature charring when it lasts)', 80, 80, 100, 100, PANEL, 'from memory'],
    ['glass', 'tempered glass', 150, 200, 200, 250, 'edge seal, not glass, sets the limit', 'common practice'],
    ['copper', 'copper or aluminium sheet, selective or painted', 200, 220, 220, 250, 'coating, not metal, sets the limit', 'common practice'],
  ] as const).map(
    ([id, name, longTermLowC, longTermHighC, shortTermLowC, shortTermHighC, source, provenance]) => ({
      id, name, longTermLowC, longTermHighC, shortTermLowC, shortTermHighC, source, provenance,
    }),
  ),
];
