import Link from 'next/link';
import { LiveDemonstration } from '@/components/study/live-demonstration';
import { demonstration } from '@/data/demonstration/larkspur-house';
import { demonstrationWeather } from './_components/demonstration-weather';

const DOORS = [
  {
    title: 'I own the house',
    text: 'Six levers, one sentence, and a list of what can go wrong. Nothing to install and nobody to ask.',
    link: 'Move the levers',
    href: '/demonstration',
  },
  {
    title: 'I design the system',
    text: 'Every number opens its equation, its inputs and their values; each equation has its source and its checks.',
    link: 'See how it computes',
    href: '/method',
  },
  {
    title: 'I advise',
    text: 'Homemade and factory-made side by side: the same house, the same year, the difference in words.',
    link: 'See three designs compared',
    href: '/demonstration/compare',
  },
] as const;

/** The start page: a working year of the demonstration house, with two of its levers. */
export default function StartPage() {
  const [design] = demonstration.designs;
  return (
    <div className="pt-7 sm:pt-10">
      <div className="flex flex-wrap items-end justify-between gap-x-10 gap-y-4">
        <h1 className="text-start">
          A year of heat,
          <br />
          laid hour by hour.
        </h1>
        <p className="max-w-[40rem] font-display text-h2 leading-7.5">
          Solar heating for one house: film over soft mats or factory plates, a store, a warm floor. Move a
          lever and all 8&#8239;760 hours are worked again.
        </p>
      </div>
      <LiveDemonstration
        house={demonstration.house}
        prices={demonstration.prices}
        design={design}
        weather={demonstrationWeather()}
      />
      <ul className="mt-7 grid gap-x-10 gap-y-6 md:grid-cols-3">
        {DOORS.map((door) => (
          <li key={door.title}>
            <h2>{door.title}</h2>
            <p className="max-w-[27rem]">
              {door.text}{' '}
              <Link href={door.href} className="whitespace-nowrap">
                {door.link}
              </Link>
            </p>
          </li>
        ))}
      </ul>
    </div>
  );
}
