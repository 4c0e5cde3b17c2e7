import { Suspense } from 'react';
import { dayStones } from '@/components/mosaic/day-stones';
import { Frieze } from '@/components/mosaic/frieze';
import { FIRST_OF_JULY, packCarriers } from '@/components/mosaic/stones';
import { readRun } from '@/lib/server/runs';
import { HOURS_PER_YEAR } from '@/lib/units/constants';

async function YearAsItStands({ designId }: { designId: string }) {
  const answer = await readRun(designId);
  if (!answer.ok) return null;
  const stones = new Uint8Array(HOURS_PER_YEAR);
  packCarriers(answer.result.columns, stones);
  return (
    <Frieze
      days={dayStones(stones, FIRST_OF_JULY)}
      label="The year as it is saved, July to June: one stone for each day, by who carried it."
    />
  );
}

/** The saved year by day, under the head of a form; the form does not wait for it. */
export function ProjectFrieze({ designId }: { designId: string | undefined }) {
  if (!designId) return null;
  return (
    <div className="min-h-[9px] max-sm:hidden">
      <Suspense fallback={null}>
        <YearAsItStands designId={designId} />
      </Suspense>
    </div>
  );
}
