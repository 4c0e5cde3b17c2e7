import { describe, expect, it } from 'vitest';
import { layerLossesWPerK, type StoreShell } from '@/lib/physics/store-loss';

const shell: StoreShell = {
  volumeL: 2000,
  heightM: 1.6,
  layers: 8,
  insulationM: 0.16,
  conductivity: 0.035,
  shape: 'cylinder',
};
const total = (store: StoreShell) => layerLossesWPerK(store).reduce((sum, loss) => sum + loss, 0);

describe('loss of a store by its surface', () => {
  it('puts the end caps on the end layers and shares the side equally', () => {
    const losses = layerLossesWPerK(shell);
    expect(losses).toHaveLength(8);
    expect(losses[0]).toBeCloseTo(losses[7]!, 12);
    expect(losses[0]).toBeGreaterThan(losses[1]!);
    expect(losses[1]).toBeCloseTo(losses[6]!, 12);
  });

  it('does not depend on the number of layers', () => {
    expect(total({ ...shell, layers: 1 })).toBeCloseTo(total(shell), 12);
    expect(total({ ...shell, layers: 12 })).toBeCloseTo(total(shell), 12);
  });

  it('lies near U A of a flat wall: 8.9 m² behind 160 mm foam', () => {
    const flat = 8.9 / (0.16 / 0.035 + 0.1);
    expect(total(shell) / flat).toBeGreaterThan(0.95);
    expect(total(shell) / flat).toBeLessThan(1.2);
  });

  it('falls with insulation and is greater for a box', () => {
    expect(total({ ...shell, insulationM: 0.3 })).toBeLessThan(total(shell));
    expect(total({ ...shell, shape: 'box' })).toBeGreaterThan(total(shell) * 0.95);
    expect(total({ ...shell, insulationM: 0.001 })).toBeGreaterThan(40);
  });
});
