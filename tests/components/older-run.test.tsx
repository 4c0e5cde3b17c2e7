// @vitest-environment jsdom
import { afterEach, describe, expect, it } from 'vitest';
import { OlderRun } from '@/components/study/older-run';
import type { RepeatedYear } from '@/components/study/older-run';
import type { Answer } from '@/lib/schemas/answer';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';
import { render, type Rendered } from './rendered';

let page: Rendered;
afterEach(() => page.close());

async function repeated(answer: Answer<RepeatedYear>): Promise<string> {
  page = await render(<OlderRun engineVersion="0.0.9" repeat={async () => answer} />);
  await page.press('Work it again and compare');
  return page.container.textContent ?? '';
}

describe('a year of an older engine', () => {
  it('says which engine worked it, and shows the differences once it is worked again', async () => {
    const text = await repeated({
      ok: true,
      sameInputs: true,
      differences: [
        { label: 'bought energy', unit: 'kWh', before: 14_000, after: 14_012.5 },
        { label: 'coldest room', unit: '°C', before: null, after: 19.5 },
      ],
    });
    expect(text).toContain('engine 0.0.9');
    expect(text).toContain(ENGINE_VERSION);
    expect(text).toContain('14\u202f000.014\u202f012.512.5');
    expect(text).toContain('coldest room, °C–19.50–');
    expect(text).not.toContain('changed since');
  });

  it('says when the inputs differ too', async () => {
    const text = await repeated({ ok: true, sameInputs: false, differences: [] });
    expect(text).toContain('the engine is not the only difference');
  });

  it('keeps its offer when the server refuses', async () => {
    const text = await repeated({ ok: false, code: 'busy', message: 'Try again in a minute.' });
    expect(text).toContain('Try again in a minute.');
    expect(text).toContain('Work it again and compare');
  });
});
