import { isCalibrated, MONTHLY_CV_RMSE_LIMIT, MONTHLY_NMBE_LIMIT } from '@/lib/calibration/agreement';
import { efficiencyDoubt } from '@/lib/calibration/efficiency-doubt';
import type { Severity } from '@/lib/checks/rules';
import type { BillsRecord } from '@/lib/schemas/bills';
import { formatFixed, formatShare, withUnit } from '@/lib/units/display';
import type { BillsStudy } from './house-by-bills';

/** What a check of house against bills has to say. */
export interface BillsFinding {
  id: string;
  severity: Severity;
  text: string;
  source: string;
}

/** Loss by drawings over loss by bills from which the savings are doubted; its inverse the other way. */
const PREBOUND_RATIO = 1.25;

function prebound(study: BillsStudy, enteredWPerK: number): BillsFinding[] {
  const byBills = study.model?.lossWPerK.value;
  if (!byBills) return [];
  const ratio = enteredWPerK / byBills;
  const source =
    'Energy and Buildings 224 (2020) 110235: before retrofit 1,172 dwellings used 23 % less than calculated';
  if (ratio > PREBOUND_RATIO)
    return [
      {
        id: 'L3',
        severity: 'caution',
        source,
        text: `The shell as entered loses ${formatFixed(ratio, 2)} times what the bills say. Savings worked out with it are probably over-stated: rooms may be kept cooler, or the shell is better than entered. Take the loss of the bills.`,
      },
    ];
  if (ratio < 1 / PREBOUND_RATIO)
    return [
      {
        id: 'L3 less',
        severity: 'caution',
        source: 'the same distance the other way; own choice',
        text: `The bills say ${formatFixed(1 / ratio, 2)} times the loss of the shell as entered. Look for draughts, a wrong calorific value or other uses on the meter before you take it.`,
      },
    ];
  return [];
}

function calibrated(study: BillsStudy): BillsFinding[] {
  const found = study.model?.agreement;
  if (!found) return [];
  const source = 'ASHRAE Guideline 14-2014, monthly data: NMBE ±5 %, CV(RMSE) 15 %';
  const figures = `NMBE ${formatShare(found.nmbe)}, CV(RMSE) ${formatShare(found.cvRmse)}`;
  if (isCalibrated(found))
    return [
      {
        id: 'L2',
        severity: 'note',
        source,
        text: `The simulated house is calibrated by these bills: ${figures}.`,
      },
    ];
  const limits = `within ±${formatShare(MONTHLY_NMBE_LIMIT)} and ${formatShare(MONTHLY_CV_RMSE_LIMIT)}`;
  return [
    {
      id: 'L2',
      severity: 'caution',
      source,
      text: `The simulated house is not calibrated by these bills: ${figures}; calibrated is ${limits}.`,
    },
  ];
}

function baseLoad({ byBills, hotWaterKwhPerDay }: BillsStudy): BillsFinding[] {
  const base = byBills.baseKwhPerDay;
  if (!base || !Number.isFinite(base.band)) return [];
  const kwh = (value: number) => withUnit(formatFixed(value, 1), 'kWh');
  const source = 'base load of the energy signature beside the hot water as entered; own check';
  if (base.value - base.band > 1.5 * hotWaterKwhPerDay)
    return [
      {
        id: 'L9',
        severity: 'note',
        source,
        text: `The bills hold ${kwh(base.value)} a day in summer too; the hot water as entered takes ${kwh(hotWaterKwhPerDay)}. The rest is loss of boiler and pipes, more hot water, or another use on the meter.`,
      },
    ];
  if (base.value + base.band < 0.6 * hotWaterKwhPerDay)
    return [
      {
        id: 'L9',
        severity: 'note',
        source,
        text: `The bills hold only ${kwh(base.value)} a day in summer; the hot water as entered takes ${kwh(hotWaterKwhPerDay)}. Is it made with another fuel, or is less used?`,
      },
    ];
  return [];
}

/**
 * Checks of a house against its bills, the gravest first.
 * @param study house and bills
 * @param bills the readings as typed
 * @param enteredWPerK heat loss of shell and air as entered [W/K]
 */
export function billsFindings(study: BillsStudy, bills: BillsRecord, enteredWPerK: number): BillsFinding[] {
  const doubt = efficiencyDoubt(bills.efficiency, bills.basis);
  const l5: BillsFinding[] = doubt
    ? [
        {
          id: 'L5',
          severity: 'stop',
          text: doubt,
          source: 'net/gross of natural gas 0.90, IPCC 2006 (from memory)',
        },
      ]
    : [];
  const l4 = study.byBills.refusals.map((text): BillsFinding => ({
    id: 'L4',
    severity: 'caution',
    text,
    source: 'fewer than 9 months or more than 30 % estimated: common practice, no source',
  }));
  return [...l5, ...l4, ...prebound(study, enteredWPerK), ...calibrated(study), ...baseLoad(study)];
}
