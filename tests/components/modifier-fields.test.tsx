// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { CollectorForm } from '@/components/forms/collector-form';
import type { SaveAnswer } from '@/components/forms/use-saving';
import { demonstration } from '@/data/demonstration/larkspur-house';
import type { DesignRecord } from '@/lib/schemas/design';
import { render, type Rendered } from './rendered';

type Save = (data: DesignRecord, version: number) => Promise<SaveAnswer<DesignRecord>>;
const saved: Save = async (_, version) => ({ ok: true, version: version + 1 });
const design = demonstration.designs[0];

/** The annex of a certificate, as in the reference row CT-03. */
const table = [1, 1, 0.99, 0.98, 0.97, 0.94, 0.9, 0.8, 0.5, 0];
const withModifier = (modifier: DesignRecord['collector']['curve']['modifier']): DesignRecord => ({
  ...design,
  collector: { ...design.collector, curve: { ...design.collector.curve, modifier } },
});

let page: Rendered;

async function open(data: DesignRecord, save: Save = saved) {
  page = await render(
    <CollectorForm designId="d1" stored={{ data, version: 1 }} currency="EUR" save={save} />,
  );
}

describe('the modifier in the collector form', () => {
  beforeEach(() => sessionStorage.clear());
  afterEach(() => page.close());

  it('shows no table while b0 rules', async () => {
    await open(design);
    expect(() => page.input('Modifier K, 40°')).toThrow();
  });

  it('shows the ten values of a table and the diffuse modifier that they give', async () => {
    await open(withModifier({ kind: 'table', values: table }));
    expect(page.input('Modifier K, 80°').value).toBe('0.5');
    expect(page.container.textContent).toContain('gives Kd = 0.90');
  });

  it('says what to type beside a wrong value and saves the mended table', async () => {
    const save = vi.fn<Save>(saved);
    await open(withModifier({ kind: 'table', values: table }), save);
    await page.type('Modifier K, 70°', '8');
    expect(page.container.textContent).toContain('K: type 0 to 1.5.');
    await page.type('Modifier K, 70°', '0,82');
    await page.press('Save');
    expect(save.mock.calls[0]?.[0].collector.curve.modifier).toEqual({
      kind: 'table',
      values: table.with(7, 0.82),
    });
  });

  it('shows both tables of a pair and how the ribs run', async () => {
    const ones = Array<number>(10).fill(1);
    await open(
      withModifier({ kind: 'pair', longitudinal: table, transversal: ones, ribs: 'across the slope' }),
    );
    expect(page.input('K along the ribs, 60°').value).toBe('0.9');
    expect(page.input('K across the ribs, 60°').value).toBe('1');
    expect(page.container.textContent).toContain('Ribs run');
  });

  it('reads a8 in powers of ten', async () => {
    const save = vi.fn<Save>(saved);
    await open(design, save);
    await page.type('Radiation loss a8', '2e-9');
    await page.press('Save');
    expect(save.mock.calls[0]?.[0].collector.curve.a8).toBe(2e-9);
  });
});
