import type { DesignRecord } from '@/lib/schemas/design';

/** A design's name as a word of the address: "Film rows, winter" becomes "film-rows-winter". */
export function designWord({ name }: Pick<DesignRecord, 'name'>): string {
  return name
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-|-$/g, '');
}
