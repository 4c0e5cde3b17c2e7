import type { Site } from '@/components/mosaic/sun-lines';
import { FIRST_OF_JULY } from '@/components/mosaic/stones';
import type { WeatherSource } from '@/lib/study/study-question';

/** The weather year of a study: where to get it and what to print of it. */
export interface StudyWeather extends Site {
  source: WeatherSource;
  name: string;
  synthetic: boolean;
}

/** First day of the mosaic where nobody has chosen: winter stands in the middle in both hemispheres. */
export function winterInTheMiddle(site: Site): number {
  return site.latitudeDeg >= 0 ? FIRST_OF_JULY : 0;
}
