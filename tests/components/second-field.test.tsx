// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { CollectorForm } from '@/components/forms/collector-form';
import { LoopAndStoreForm } from '@/components/forms/loop-and-store-form';
import type { SaveAnswer } from '@/components/forms/use-saving';
import { collectorByCover } from '@/data/collectors/generic';
import { demonstration } from '@/data/demonstration/larkspur-house';
import type { DesignRecord } from '@/lib/schemas/design';
import { render, settled, type Rendered } from './rendered';

type Save = (data: DesignRecord, version: number) => Promise<SaveAnswer<DesignRecord>>;
const saved: Save = async (_, version) => ({ ok: true, version: version + 1 });

const [one] = demonstration.designs;
const factory = collectorByCover['selective glass'];
const two: DesignRecord = {
  ...one,
  second: { collector: factory, array: { ...one.array, areaM2: 6, tiltDeg: 50 } },
};

let page: Rendered;

async function open(Form: typeof LoopAndStoreForm, data: DesignRecord, save: Save = saved) {
  page = await render(<Form designId="d1" stored={{ data, version: 1 }} currency="EUR" save={save} />);
}

const at = (path: string) => document.getElementById(`field-${path}`) as HTMLInputElement | null;

async function typeAt(path: string, text: string) {
  const field = at(path)!;
  await settled(() => {
    field.focus();
    Object.getOwnPropertyDescriptor(HTMLInputElement.prototype, 'value')!.set!.call(field, text);
    field.dispatchEvent(new Event('input', { bubbles: true }));
  });
  await settled(() => field.blur());
}

describe('a second collector field', () => {
  beforeEach(() => sessionStorage.clear());
  afterEach(() => page.close());

  it('begins with a generic class and the first array, and is saved with figures of its own', async () => {
    const save = vi.fn<Save>(saved);
    await open(LoopAndStoreForm, one, save);
    expect(at('second.array.areaM2')).toBeNull();
    await page.press('Add a second field');
    expect(document.activeElement).toBe(at('second.array.areaM2'));
    expect(at('second.array.tiltDeg')!.value).toBe(String(one.array.tiltDeg));
    await typeAt('second.array.areaM2', '6,5');
    await page.press('Save');
    const data = save.mock.calls[0]![0];
    expect(data.second?.array).toEqual({ ...one.array, areaM2: 6.5 });
    expect(data.second?.collector).toEqual(factory);
    expect(data.array).toEqual(one.array);
  });

  it('is judged like the first and holds up a save until it is mended', async () => {
    const save = vi.fn<Save>(saved);
    await open(LoopAndStoreForm, two, save);
    await typeAt('second.array.tiltDeg', '5');
    expect(page.container.textContent).toContain('Tilt: type 25 to 90 °.');
    await page.press('Save');
    expect(save).not.toHaveBeenCalled();
  });

  it('is removed, put back as it was, and removed for good by a save', async () => {
    const save = vi.fn<Save>(saved);
    await open(LoopAndStoreForm, two, save);
    await page.press('Remove the second field');
    expect(at('second.array.areaM2')).toBeNull();
    expect(document.activeElement?.textContent).toBe('Add a second field');
    await page.press('Put it back');
    expect(at('second.array.areaM2')!.value).toBe('6');
    await page.press('Save');
    expect(save.mock.calls[0]![0]).toEqual(two);
    await page.press('Remove the second field');
    await page.press('Save');
    expect(save.mock.calls[1]![0].second).toBeNull();
  });

  it('survives a reload before it is saved', async () => {
    await open(LoopAndStoreForm, one);
    await page.press('Add a second field');
    await typeAt('second.array.areaM2', '9');
    await page.close();
    await open(LoopAndStoreForm, one);
    expect(at('second.array.areaM2')!.value).toBe('9');
    await page.press('Discard it');
    expect(at('second.array.areaM2')).toBeNull();
  });

  it('has a collector of its own, whole and in the same figures', async () => {
    const save = vi.fn<Save>(saved);
    await open(CollectorForm, two, save);
    expect(at('second.collector.curve.eta0Beam')!.value).toBe(String(factory.curve.eta0Beam));
    expect(at('second.collector.parts.0.material')!.value).toBe(factory.parts[0]!.material);
    await typeAt('second.collector.curve.a1', '3.4');
    await page.press('Save');
    const data = save.mock.calls[0]![0];
    expect(data.second?.collector.curve.a1).toBe(3.4);
    expect(data.second?.array).toEqual(two.second?.array);
    expect(data.collector).toEqual(one.collector);
  });

  it('takes a generic class with all its parts, whatever stood there before', async () => {
    const save = vi.fn<Save>(saved);
    await open(CollectorForm, two, save);
    const buttons = [...page.container.querySelectorAll('button')].filter(
      ({ textContent }) => textContent === 'Lay it in',
    );
    expect(buttons).toHaveLength(2);
    await settled(() => buttons[1]!.click());
    const unglazed = collectorByCover.none;
    const rows = (of: string) => page.container.querySelectorAll(`[name^="${of}.parts."][name$=".name"]`);
    expect(rows('second.collector')).toHaveLength(unglazed.parts.length);
    await page.press('Save');
    expect(save.mock.calls[0]![0].second?.collector).toEqual(unglazed);
  });
});
