import * as Comlink from 'comlink';
import { climateYear } from '@/data/climates/climates';
import { findings } from '@/lib/checks/findings';
import { designCost } from '@/lib/economics/design-cost';
import { createSimulator } from '@/lib/simulation/simulate';
import { warmUp } from '@/lib/simulation/warm-up';
import type { StudyOutcome, StudyQuestion, StudyWorker, WeatherSource } from '@/lib/study/study-question';
import { decodeWeatherYear } from '@/lib/weather/packed-weather';
import type { WeatherYear } from '@/lib/weather/weather-year';

const simulator = createSimulator();
const weatherYears = new Map<string, Promise<WeatherYear | undefined>>();

async function loadWeather(source: WeatherSource): Promise<WeatherYear | undefined> {
  if (source.kind === 'climate') return climateYear(source.climateId);
  const response = await fetch(source.url);
  return response.ok ? decodeWeatherYear(await response.arrayBuffer()) : undefined;
}

/** The weather year of a source, read once; a failed reading is tried again with the next question. */
function weatherOf(source: WeatherSource): Promise<WeatherYear | undefined> {
  const key = source.kind === 'climate' ? source.climateId : source.url;
  const known = weatherYears.get(key);
  if (known) return known;
  const loading = loadWeather(source).catch(() => undefined);
  weatherYears.set(key, loading);
  void loading.then((year) => year ?? weatherYears.delete(key));
  return loading;
}

const NUMERICS = { theta: 0.5, skyModel: 'hdkr' } as const;
const NO_WEATHER: StudyOutcome = {
  ok: false,
  code: 'weather',
  message: 'The weather year could not be read. Check the connection, then retry.',
};

async function answer({ weather: source, house, design, prices }: StudyQuestion): Promise<StudyOutcome> {
  const weather = await weatherOf(source);
  if (!weather) return NO_WEATHER;
  const outcome = simulator.run({ weather, house, design, numerics: NUMERICS });
  if (!outcome.ok) return outcome;
  const { result } = outcome;
  const cost = designCost(design, prices, result);
  return {
    ok: true,
    answer: { design, result, cost, findings: findings({ house, design, result }) },
  };
}

const worker: StudyWorker = {
  async answer(question) {
    const outcome = await answer(question);
    if (!outcome.ok) return outcome;
    const columns: (Float32Array | Uint8Array)[] = Object.values(outcome.answer.result.columns);
    return Comlink.transfer(
      outcome,
      columns.map((column) => column.buffer),
    );
  },
  async warmUp({ weather: source, house, design }) {
    const weather = await weatherOf(source);
    if (weather) warmUp(simulator, { weather, house, design, numerics: NUMERICS });
  },
  async backupKwh({ weather: source, house, design }) {
    const weather = await weatherOf(source);
    const outcome = weather && simulator.run({ weather, house, design, numerics: NUMERICS });
    return outcome?.ok ? outcome.result.year.backupHeatingKwh + outcome.result.year.backupTapKwh : undefined;
  },
};

Comlink.expose(worker);
