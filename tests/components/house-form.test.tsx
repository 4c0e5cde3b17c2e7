// @vitest-environment jsdom
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { HouseForm } from '@/components/forms/house-form';
import type { SaveAnswer } from '@/components/forms/use-saving';
import { houseSchema, type HouseRecord } from '@/lib/schemas/house';
import { render, type Rendered } from './rendered';

const house = houseSchema.parse({
  name: 'Test house',
  shell: [
    { name: 'Walls', kind: 'wall', areaM2: 100, uWPerM2K: 0.6, factor: 1 },
    { name: 'Panes', kind: 'window', areaM2: 20, uWPerM2K: 1.5, factor: 1 },
  ],
  windows: [],
  emitters: { floor: {}, radiators: {} },
  hotWater: {},
  backup: {},
});

type Save = (data: HouseRecord, version: number) => Promise<SaveAnswer<HouseRecord>>;

let page: Rendered;

async function open(save: Save = async (_, version) => ({ ok: true, version: version + 1 })) {
  page = await render(
    <HouseForm projectId="p1" stored={{ data: house, version: 3 }} currency="EUR" save={save} />,
  );
}

const words = () => page.container.textContent;

describe('the house form', () => {
  beforeEach(() => sessionStorage.clear());
  afterEach(() => page.close());

  it('shows unit, origin and range beside a number', async () => {
    await open();
    const field = page.input('Air change').closest('div')!.parentElement!;
    expect(field.textContent).toContain('1/h');
    expect(field.textContent).toContain('common practice');
    expect(field.textContent).toContain('0.05 to 3');
  });

  it('says what to type instead, beside the field, and offers the likely value', async () => {
    await open();
    await page.type('U, row 2', '16');
    expect(page.input('U, row 2').getAttribute('aria-invalid')).toBe('true');
    expect(words()).toContain('U: type 0.05 to 6 W/(m²K). Did you mean 1.6?');
    await page.press('1.6');
    expect(page.input('U, row 2').value).toBe('1.6');
    expect(page.input('U, row 2').getAttribute('aria-invalid')).toBe('false');
  });

  it('holds the last good value while a field is in error', async () => {
    await open();
    await page.type('U, row 2', '2');
    expect(words()).toContain('windows 40');
    await page.type('U, row 2', '20');
    expect(words()).toContain('held');
    expect(words()).toContain('Sum without the held row');
    expect(words()).toContain('windows 40');
  });

  it('takes a decimal comma', async () => {
    const save = vi.fn<Save>(async (_, version) => ({ ok: true, version: version + 1 }));
    await open(save);
    await page.type('Room temperature', '21,5');
    await page.press('Save');
    expect(save.mock.calls[0]?.[0].roomSetC).toBe(21.5);
    expect(save.mock.calls[0]?.[1]).toBe(3);
    expect(words()).toContain('saved at');
  });

  it('never turns an empty field into its default', async () => {
    const save = vi.fn<Save>();
    await open(save);
    await page.type('Room temperature', '');
    expect(words()).toContain('Room temperature: type 12 to 26 °C. The field is empty.');
    await page.press('Save');
    expect(save).not.toHaveBeenCalled();
  });

  it('keeps what was typed through a reload, also where it is wrong', async () => {
    await open();
    await page.type('Room temperature', '99');
    await page.type('Heated volume', '355');
    await page.close();
    await open();
    expect(page.input('Room temperature').value).toBe('99');
    expect(page.input('Heated volume').value).toBe('355');
    expect(words()).toContain('What you typed before and had not saved is back.');
    await page.press('Discard it');
    expect(page.input('Room temperature').value).toBe('20.5');
    expect(sessionStorage.length).toBe(0);
  });

  it('keeps what was typed when the server refuses or never answers', async () => {
    await open(async () => Promise.reject(new Error('gone')));
    await page.type('Heated volume', '355');
    await page.press('Save');
    expect(words()).toContain('The server did not answer.');
    expect(page.input('Heated volume').value).toBe('355');
    expect(sessionStorage.length).toBe(1);
  });

  it('lets one choose after a lost race', async () => {
    const theirs = { ...house, roomSetC: 19 };
    const save = vi.fn<Save>(async (_, version) =>
      version === 3
        ? {
            ok: false,
            code: 'conflict',
            message: 'Somebody saved this house first.',
            current: { data: theirs, version: 4 },
          }
        : { ok: true, version: version + 1 },
    );
    await open(save);
    await page.type('Room temperature', '22');
    await page.press('Save');
    expect(words()).toContain('Somebody saved this house first.');
    expect(page.input('Room temperature').value).toBe('22');
    await page.press('keep mine');
    expect(save.mock.calls[1]?.[0].roomSetC).toBe(22);
    expect(save.mock.calls[1]?.[1]).toBe(4);
    expect(words()).toContain('saved at');
    expect(sessionStorage.length).toBe(0);
  });

  it('adds a row, takes one out and puts it back', async () => {
    await open();
    await page.press('Add an element');
    expect(page.input('Element, row 3').value).toBe('Outer wall');
    await page.press('Take out Walls');
    expect(page.input('Element, row 1').value).toBe('Panes');
    await page.press('Put back what was taken out');
    expect(page.input('Element, row 1').value).toBe('Walls');
    expect(words()).toContain('walls 84');
  });

  it('says that the loss is that of the bills, and lets it go', async () => {
    const save = vi.fn<Save>(async (_, version) => ({ ok: true, version: version + 1 }));
    const calibration = { factor: 0.8, basis: 'bills' } as const;
    page = await render(
      <HouseForm
        projectId="p1"
        stored={{ data: { ...house, calibration }, version: 3 }}
        currency="EUR"
        save={save}
      />,
    );
    expect(words()).toContain('Scaled to the fuel bills: × 0.80');
    await page.press('Take the shell as entered again');
    expect(words()).toContain('The loss is that of the shell and the air as entered.');
    await page.press('Save');
    expect(save.mock.calls[0]?.[0].calibration).toEqual({ factor: 1, basis: 'as entered' });
  });
});
