import type { Finding } from '@/lib/checks/findings';
import type { DesignCost } from '@/lib/economics/design-cost';
import type { DesignRecord } from '@/lib/schemas/design';
import type { HouseRecord } from '@/lib/schemas/house';
import type { Prices } from '@/lib/schemas/prices';
import type { YearResult } from '@/lib/simulation/results';

/** Where a weather year comes from: one of the shipped climates, or a packed year of this server. */
export type WeatherSource = { kind: 'climate'; climateId: string } | { kind: 'packed'; url: string };

/** What one tick of a study asks. */
export interface StudyQuestion {
  weather: WeatherSource;
  house: HouseRecord;
  design: DesignRecord;
  prices: Prices;
}

/** What it gets: the year, what it costs, what to beware of, and the design that all this is about. */
export interface StudyAnswer {
  design: DesignRecord;
  result: YearResult;
  cost: DesignCost;
  findings: Finding[];
}

export type StudyOutcome = { ok: true; answer: StudyAnswer } | { ok: false; code: string; message: string };

/** The functions of the browser worker, as the page calls them. */
export interface StudyWorker {
  answer(question: StudyQuestion): Promise<StudyOutcome>;
  /** lets the engine be compiled on all seasons and sizes */
  warmUp(question: StudyQuestion): Promise<void>;
  /** heat that the backup gives in the year [kWh], for the traces of the levers; undefined when it cannot be worked */
  backupKwh(question: StudyQuestion): Promise<number | undefined>;
}
