const DAYS = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31];
const HEADER =
  'LOCATION,Invented Hill,-,ZZZ,invented,000000,46.00,8.00,1.0,450.0\n' +
  'COMMENTS 1,made by a test\n' +
  'DATA PERIODS,1,1,Data,Sunday, 1/ 1,12/31\n';

function row(day: number, month: number, dayOfMonth: number, hour: number): string {
  const season = -Math.cos((2 * Math.PI * (day - 15)) / 365);
  const height = Math.max(0, Math.sin((Math.PI * (hour - 6.5)) / 12)) * (0.55 + 0.35 * season);
  const global = Math.round(900 * height);
  const diffuse = Math.round(0.4 * global);
  const beam = Math.round(500 * height);
  const dryBulb = (9 + 9 * season + 4 * Math.sin((Math.PI * (hour - 9)) / 12)).toFixed(1);
  const values = [dryBulb, '2.0', 70, 96000, 0, 0, 300, global, beam, diffuse, 0, 0, 0, 0, 180, '2.5'];
  const rest = [5, 5, 20, 3000, 9, 999999999, 100, '0.1', 0, 0, '0.2', 0, 0];
  return [2001, month, dayOfMonth, hour, 60, 'A7', ...values, ...rest].join(',');
}

/** An hourly file of an invented place: smooth days, warm summers, 8,760 rows. */
export function epwText(): string {
  const rows: string[] = [];
  let day = 0;
  DAYS.forEach((count, month) => {
    for (let dayOfMonth = 1; dayOfMonth <= count; dayOfMonth++, day++) {
      for (let hour = 1; hour <= 24; hour++) rows.push(row(day, month + 1, dayOfMonth, hour));
    }
  });
  return `${HEADER}${rows.join('\n')}\n`;
}
