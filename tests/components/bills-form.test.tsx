// @vitest-environment jsdom
import { createElement, type ComponentProps } from 'react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { BillsForm } from '@/components/bills/bills-form';
import type { SaveAnswer } from '@/components/forms/use-saving';
import { larkspurBills } from '@/data/demonstration/larkspur-bills';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { billsSchema, type BillsRecord } from '@/lib/schemas/bills';
import { render, settled, type Rendered } from './rendered';

vi.mock('next/navigation', () => ({ usePathname: () => '/projects/p1/bills' }));
vi.mock('next/link', () => ({ default: (props: ComponentProps<'a'>) => createElement('a', props) }));
vi.mock('@/components/charts/plot-figure', () => ({ PlotFigure: () => null }));

/** A year that swings between −4 and 20 °C. */
const typicalDayC = Array.from({ length: 365 }, (_, day) => 8 - 12 * Math.cos((2 * Math.PI * day) / 365));
/** A simulated house of 170 W/K that heats below 15 °C. */
const dayKwh = typicalDayC.map((outdoorC) => 8 + 0.024 * 170 * Math.max(0, 15 - outdoorC));

type Save = (data: BillsRecord, version: number) => Promise<SaveAnswer<BillsRecord>>;

let page: Rendered;

async function open(
  bills: BillsRecord,
  save: Save = async (_, version) => ({ ok: true, version: version + 1 }),
) {
  page = await render(
    <BillsForm
      projectId="p1"
      stored={{ data: bills, version: 3 }}
      typicalDayC={typicalDayC}
      modelHeat={Promise.resolve({ ok: true, dayKwh })}
      house={demonstration.house}
      houseVersion={1}
      weatherName="Testland (synthetic)"
      save={save}
      scale={async () => ({ ok: true })}
      release={async () => ({ ok: true })}
    />,
  );
  await settled();
}

const words = () => page.container.textContent;

async function paste(text: string) {
  await settled(() => {
    const box = page.container.querySelector('textarea')!;
    Object.getOwnPropertyDescriptor(HTMLTextAreaElement.prototype, 'value')!.set!.call(box, text);
    box.dispatchEvent(new Event('input', { bubbles: true }));
  });
}

describe('the bills', () => {
  beforeEach(() => sessionStorage.clear());
  afterEach(() => page.close());

  it('answer the rows of the demonstration in words', async () => {
    await open(larkspurBills());
    expect(words()).toContain('26 readings, 25 of them used, 2 estimated.');
    expect(words()).toContain('It overlaps row 19 in 12 days');
    expect(words()).toContain('Estimated: joined with row 9 to one interval');
    expect(words()).toContain('23 intervals between real readings put the loss of this house at');
  });

  it('are taken from a spreadsheet, decimal commas and estimates with them', async () => {
    const save = vi.fn<Save>(async (_, version) => ({ ok: true, version: version + 1 }));
    await open(billsSchema.parse({}), save);
    expect(words()).toContain('There are no readings to go by yet.');
    await paste('von\tbis\tkg\n1.1.2024\t1.2.2024\t612,5\n1.2.2024\t1.3.2024\t540\test\n');
    expect(words()).toContain('2 readings found, the last of 1 March 2024.');
    await page.press('Take them');
    expect(page.input('Quantity, row 1').value).toBe('612.5');
    expect(page.input('Estimated, row 2').checked).toBe(true);
    await page.press('Save');
    expect(save.mock.calls[0]?.[0].rows).toEqual([
      { from: '2024-01-01', to: '2024-02-01', quantity: 612.5, estimated: false },
      { from: '2024-02-01', to: '2024-03-01', quantity: 540, estimated: true },
    ]);
  });

  it('ask for the order of day and month of a paste', async () => {
    await open(billsSchema.parse({}));
    await paste('3/4/2024;5/5/2024;100');
    expect(words()).toContain('Row 1: “3/4/2024” can be read in two ways.');
    await page.press('4 March 2024');
    await page.press('Take them');
    expect(page.input('First day, row 1').value).toBe('2024-03-04');
    await page.press('Put back what was there');
    expect(page.container.querySelector('[name="rows.0.from"]')).toBeNull();
  });

  it('name the rows of a paste that they cannot take', async () => {
    await open(billsSchema.parse({}));
    await paste('2024-01-01;2024-02-01;100\n2024-02-01;;90');
    expect(words()).toContain('Row 2: it has one date.');
  });

  it('ask for the order in a field, and take a day in words', async () => {
    await open(larkspurBills());
    await page.type('First day, row 1', '1 May 2024');
    expect(page.input('First day, row 1').value).toBe('2024-05-01');
    await page.type('First day, row 1', '2/5/2024');
    expect(words()).toContain('“2/5/2024” can be two days. Is it 2 May 2024 or 5 February 2024?');
    await page.press('2 May 2024');
    expect(page.input('First day, row 1').value).toBe('2024-05-02');
  });

  it('change their figure once the overlap is mended, and want saving before it is taken', async () => {
    await open(larkspurBills());
    await page.type('First day, row 20', '1.12.2025');
    expect(words()).toContain('26 readings, 26 of them used');
    expect(words()).toContain('24 intervals between real readings');
    expect(words()).toContain('Save the readings first.');
  });

  it('refuse a slope in words, and give a range', async () => {
    const few = { ...larkspurBills(), rows: larkspurBills().rows.slice(5, 8) };
    await open(few);
    expect(words()).toContain('No slope is read from these bills');
    expect(words()).toContain('It lies somewhere between');
    expect(words()).toContain('There are 2 intervals between real readings; a slope needs 6.');
  });

  it('doubt an efficiency that its calorific value forbids', async () => {
    await open(larkspurBills());
    await page.type('Efficiency over the year', '1.2');
    expect(words()).toContain('Stop. An efficiency of 1.2 on the net calorific value');
  });
});
