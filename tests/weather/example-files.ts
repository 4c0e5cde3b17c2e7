import { DAYS_IN_MONTH } from '@/lib/units/constants';

/** One hour of an example file; all of it made up. */
export interface ExampleHour {
  month: number;
  day: number;
  /** 1–24, end of the hour */
  hour: number;
  dryBulb: string;
  global: string;
  beam: string;
  diffuse: string;
  wind: string;
}

/** A plain year: half-sine days, warm in July, written as the formats write it. */
export function exampleHours(): ExampleHour[] {
  const hours: ExampleHour[] = [];
  let dayOfYear = 0;
  DAYS_IN_MONTH.forEach((days, month) => {
    for (let day = 1; day <= days; day++, dayOfYear++) {
      const season = -Math.cos((2 * Math.PI * (dayOfYear - 15)) / 365);
      for (let hour = 1; hour <= 24; hour++) {
        const height = Math.max(0, Math.sin((Math.PI * (hour - 6.5)) / 12));
        const global = Math.round(height * (550 + 300 * season));
        hours.push({
          month: month + 1,
          day,
          hour,
          dryBulb: (8 + 11 * season + 4 * height).toFixed(1),
          global: String(global),
          beam: String(Math.round(0.8 * global)),
          diffuse: String(Math.round(0.4 * global)),
          wind: '3.1',
        });
      }
    }
  });
  return hours;
}

const EPW_HEADER = [
  'LOCATION,"Saltmarsh, North",XX,Invented,MADE,000000,47.50,8.5000000E+00,1,410.0',
  'DESIGN CONDITIONS,0',
  'TYPICAL/EXTREME PERIODS,0',
  'GROUND TEMPERATURES,0',
  'HOLIDAYS/DAYLIGHT SAVINGS,No,0,0,0',
  'COMMENTS 1,made for a test',
  'COMMENTS 2,',
  'DATA PERIODS,1,1,Data,Sunday,1/1,12/31',
];

export function epwRow(h: ExampleHour, year = 1991 + h.month): string {
  const start = `${year},${h.month},${h.day},${h.hour},60,?9?9`;
  const air = `${h.dryBulb},2.5,70,96500,0,0,290`;
  const sun = `${h.global},${h.beam},${h.diffuse},0,0,0,0`;
  return `${start},${air},${sun},180,${h.wind},5,5,20.0,2000,9,999999999,10,0.1,0,88,0.200,0.0,1.0`;
}

export function epwText(hours: readonly ExampleHour[], header: readonly string[] = EPW_HEADER): string {
  return [...header, ...hours.map((h) => epwRow(h))].join('\r\n') + '\r\n';
}

export const epwHeader = (): string[] => [...EPW_HEADER];

const TMY3_NAMES =
  'Date (MM/DD/YYYY),Time (HH:MM),ETR (W/m^2),ETRN (W/m^2),GHI (W/m^2),GHI source,GHI uncert (%),DNI (W/m^2),DNI source,DNI uncert (%),DHI (W/m^2),DHI source,DHI uncert (%),Dry-bulb (C),Dry-bulb source,Dew-point (C),RHum (%),Pressure (mbar),Wspd (m/s),Wspd source,Alb (unitless)';

export function tmy3Row(h: ExampleHour, midnight: '24:00' | '00:00' = '24:00'): string {
  const two = (n: number): string => String(n).padStart(2, '0');
  const date = `${two(h.month)}/${two(h.day)}/${1990 + h.month}`;
  const time = h.hour === 24 ? midnight : `${two(h.hour)}:00`;
  return `${date},${time},0,0,${h.global},1,9,${h.beam},1,9,${h.diffuse},1,9,${h.dryBulb},A,2.5,70,965,${h.wind},A,-9900`;
}

export function tmy3Text(hours: readonly ExampleHour[], midnight: '24:00' | '00:00' = '24:00'): string {
  const station = '123456,"SALTMARSH [OLD MILL], NORTH",XX,1.0,47.500,8.500,410';
  return [station, TMY3_NAMES, ...hours.map((h) => tmy3Row(h, midnight))].join('\n') + '\n';
}

export const bytesOf = (text: string): Uint8Array => new TextEncoder().encode(text);
