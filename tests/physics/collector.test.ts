import { describe, expect, it } from 'vitest';
import { fromEn12975Glazed, linearLoss, steadyPower, toAreaBasis } from '@/lib/physics/collector';
import { beamModifier, diffuseModifierFromB0, modifierFromTable } from '@/lib/physics/incidence-angle';

const curve = { eta0Beam: 0.76, diffuseModifier: 0.9, a1: 4, a2: 0.01, a3: 0.3, a4: 0, a6: 0 };
const at = { beamWm2: 600, beamModifier: 0.98, diffuseWm2: 120, airC: 5, windMPerS: 2, longwaveWm2: 260 };

describe('collector curve', () => {
  it('keeps its power when the area basis changes', () => {
    const gross = toAreaBasis(curve, 1.8, 2);
    expect(2 * steadyPower(gross, 45, at)).toBeCloseTo(1.8 * steadyPower(curve, 45, at), 9);
  });

  it('falls with the fluid temperature, also below the air', () => {
    const temperatures = [-20, 0, 5, 20, 50, 90, 140];
    const powers = temperatures.map((fluidC) => steadyPower(curve, fluidC, at));
    for (let i = 1; i < powers.length; i++) expect(powers[i]).toBeLessThan(powers[i - 1]!);
  });

  it('holds its linear loss at 0.3 a1 in a calm', () => {
    expect(linearLoss(4, 2, 0)).toBe(1.2);
    expect(linearLoss(4, 0.3, 3)).toBe(4);
  });

  it('reads wind terms of the old standard from 0 m/s (EN 12975-2)', () => {
    const converted = fromEn12975Glazed({
      eta0: 0.78,
      diffuseModifier: 0.9,
      c1: 3.1,
      c2: 0.01,
      c3: 0.3,
      c4: 0,
      c6: 0,
    });
    expect(linearLoss(converted.a1, converted.a3, 2)).toBeCloseTo(3.1 + 2 * 0.3, 12);
  });
});

describe('incidence-angle modifiers', () => {
  it('take no beam from behind and never turn negative', () => {
    expect(beamModifier(0.1, -0.2)).toBe(0);
    expect(beamModifier(0.1, 0)).toBe(0);
    expect(beamModifier(0.1, 0.05)).toBe(0);
    expect(beamModifier(0.1, 1)).toBe(1);
  });

  it('read a table by straight lines', () => {
    const table = [1, 1, 0.99, 0.98, 0.97, 0.94, 0.9, 0.8, 0.5, 0];
    expect(modifierFromTable(table, 75)).toBeCloseTo(0.65, 12);
    expect(modifierFromTable(table, 95)).toBe(0);
  });

  it('agree with the hemisphere of the b0 form', () => {
    const steps = 200_000;
    let sum = 0;
    for (let i = 0; i < steps; i++) {
      const angle = ((i + 0.5) * Math.PI) / 2 / steps;
      sum += (beamModifier(0.12, Math.cos(angle)) * Math.sin(2 * angle) * Math.PI) / 2 / steps;
    }
    expect(sum).toBeCloseTo(diffuseModifierFromB0(0.12), 6);
  });
});
