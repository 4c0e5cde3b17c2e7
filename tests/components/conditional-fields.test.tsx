// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HouseForm } from '@/components/forms/house-form';
import { LoopAndStoreForm } from '@/components/forms/loop-and-store-form';
import type { SaveAnswer } from '@/components/forms/use-saving';
import { demonstration } from '@/data/demonstration/larkspur-house';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import { render, settled, type Rendered } from './rendered';

type Save<T> = (data: T, version: number) => Promise<SaveAnswer<T>>;
const saved = async (_: unknown, version: number) => ({ ok: true as const, version: version + 1 });

let page: Rendered;

async function openHouse(save: Save<HouseRecord> = saved) {
  page = await render(
    <HouseForm
      projectId="p1"
      stored={{ data: demonstration.house, version: 1 }}
      currency="EUR"
      save={save}
    />,
  );
}

async function openLoop() {
  page = await render(
    <LoopAndStoreForm
      designId="d1"
      stored={{ data: demonstration.designs[0], version: 1 }}
      currency="EUR"
      save={saved satisfies Save<DesignRecord>}
    />,
  );
}

const shown = (path: string) => document.getElementById(`field-${path}`) !== null;

async function choose(path: string, word: string) {
  const select = document.getElementById(`field-${path}`);
  if (!(select instanceof HTMLSelectElement)) throw new Error(`No choice at "${path}".`);
  await settled(() => {
    select.value = word;
    select.dispatchEvent(new Event('change', { bubbles: true }));
  });
}

describe('fields that matter for one choice', () => {
  beforeEach(() => sessionStorage.clear());
  afterEach(() => page.close());

  it('asks for the source of a heat pump and not for the efficiency of a boiler', async () => {
    await openHouse();
    expect(shown('backup.seasonalEfficiency')).toBe(true);
    expect(shown('backup.heatPump.source')).toBe(false);
    await choose('backup.fuel', 'heat pump');
    expect(shown('backup.seasonalEfficiency')).toBe(false);
    expect(shown('backup.heatPump.carnotShare')).toBe(true);
    expect(shown('backup.heatPump.groundC')).toBe(false);
    await choose('backup.heatPump.source', 'ground');
    expect(shown('backup.heatPump.groundC')).toBe(true);
  });

  it('asks for a coil or a plate, for hours of the night, for the zone of the floor', async () => {
    await openHouse();
    await choose('hotWater.exchanger', 'coil');
    expect([shown('hotWater.coilWPerK'), shown('hotWater.exchangerEffectiveness')]).toEqual([true, false]);
    expect(shown('setback.nightC')).toBe(false);
    await settled(() => page.input('Night setback').click());
    expect(shown('setback.nightC')).toBe(true);
    expect(shown('emitters.zones.floorShare')).toBe(false);
    await choose('emitters.zones.share', 'by zone');
    expect(shown('emitters.zones.floorShare')).toBe(true);
  });

  it('keeps and saves the value of a hidden field', async () => {
    const save = vi.fn<Save<HouseRecord>>(saved);
    await openHouse(save);
    await choose('hotWater.exchanger', 'coil');
    await page.type('Coil', '640');
    await choose('hotWater.exchanger', 'plate');
    expect(shown('hotWater.coilWPerK')).toBe(false);
    await page.press('Save');
    expect(save.mock.calls[0]?.[0].hotWater).toMatchObject({ exchanger: 'plate', coilWPerK: 640 });
  });

  it('leaves a field in sight that has something to mend', async () => {
    await openHouse();
    await choose('hotWater.exchanger', 'coil');
    await page.type('Coil', '1');
    await choose('hotWater.exchanger', 'plate');
    expect(page.container.textContent).toContain('Coil: type 20 to 5000 W/K.');
    await page.type('Coil', '700');
    expect(shown('hotWater.coilWPerK')).toBe(false);
  });

  it('says why floor and radiators are gone with ideal heating', async () => {
    await openHouse();
    await choose('emitters.kind', 'ideal');
    expect(shown('emitters.floor.areaM2')).toBe(false);
    expect(page.container.textContent).toContain('Ideal heating has no floor and no radiators');
  });

  it('asks for vessel, exchanger, slab and store as the layout has them', async () => {
    await openLoop();
    const fields = [
      'loop.exchangerEffectiveness',
      'loop.vesselReserveL',
      'loop.slabRoomLimitC',
      'store.volumeL',
    ];
    expect(fields.map(shown)).toEqual([false, false, false, true]);
    await choose('loop.layout', 'vessel with exchanger');
    expect(fields.map(shown)).toEqual([true, true, false, true]);
    await choose('loop.layout', 'straight to the slab');
    expect(fields.map(shown)).toEqual([false, true, true, false]);
    expect(page.container.textContent).toContain('there is no store; its figures are kept');
  });

  it('asks for the points of a pump curve or for a flow, and for the spacing of two rows', async () => {
    await openLoop();
    expect([shown('loop.pump.shutOffHeadM'), shown('array.flowKgPerSM2')]).toEqual([false, true]);
    await choose('loop.pump.kind', 'curve');
    expect([shown('loop.pump.shutOffHeadM'), shown('array.flowKgPerSM2')]).toEqual([true, false]);
    await page.type('Rows', '1');
    expect(shown('array.rowSpacingM')).toBe(false);
    await page.type('Rows', '2');
    expect(shown('array.rowSpacingM')).toBe(true);
  });
});
