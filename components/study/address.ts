import type { DesignRecord } from '@/lib/schemas/design';
import { COVER_LABELS, LEVERS, coverChoices, withCollector, withMonths } from './levers';

/** The state of the levers as search parameters; only what differs from the saved design is written. */
export function writeAddress(design: DesignRecord, saved: DesignRecord): URLSearchParams {
  const params = new URLSearchParams();
  for (const lever of LEVERS) {
    const value = lever.read(design);
    if (value !== lever.read(saved)) params.set(lever.id, String(value));
  }
  if (design.collector.cover !== saved.collector.cover) {
    params.set('cover', COVER_LABELS[design.collector.cover].short);
  }
  const months = monthsWord(design);
  if (months !== monthsWord(saved)) params.set('months', months);
  return params;
}

function monthsWord(design: DesignRecord): string {
  return design.array.mountedMonths.map((mounted) => (mounted ? '1' : '0')).join('');
}

export interface AddressState {
  design: DesignRecord;
  /** parameters that could not be read, by name; the saved value stands instead */
  broken: string[];
}

/** Reads the levers back; what does not fit is named and left as saved. */
export function readAddress(params: URLSearchParams, saved: DesignRecord): AddressState {
  let design = saved;
  const broken: string[] = [];
  for (const lever of LEVERS) {
    const text = params.get(lever.id);
    if (text === null) continue;
    const value = Number(text);
    if (text.trim() !== '' && value >= lever.meta.min && value <= lever.meta.max)
      design = lever.write(design, value);
    else broken.push(lever.id);
  }
  const cover = params.get('cover');
  if (cover !== null) {
    const collector = coverChoices(saved).find((choice) => COVER_LABELS[choice.cover].short === cover);
    if (collector) design = withCollector(design, collector);
    else broken.push('cover');
  }
  const months = params.get('months');
  if (months !== null) {
    if (/^[01]{12}$/.test(months))
      design = withMonths(
        design,
        [...months].map((digit) => digit === '1'),
      );
    else broken.push('months');
  }
  return { design, broken };
}
