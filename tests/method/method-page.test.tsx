import { existsSync } from 'node:fs';
import path from 'node:path';
import { renderToStaticMarkup } from 'react-dom/server';
import ts from 'typescript';
import { describe, expect, it } from 'vitest';
import ChangesPage from '@/app/(public)/method/changes/page';
import ChoicesPage from '@/app/(public)/method/choices/page';
import LimitsPage from '@/app/(public)/method/limits/page';
import MethodIndexPage from '@/app/(public)/method/page';
import TopicPage from '@/app/(public)/method/[topic]/page';
import { CHANGES } from '@/lib/method/changes';
import { CHOICES } from '@/lib/method/choices';
import { methodPages } from '@/lib/method/method-page';
import { withNumbers } from '@/lib/method/named-numbers';
import { filesOf, parseSource } from '@/lib/method/parse-source';
import { TOPICS, WITHOUT_EQUATIONS } from '@/lib/method/topics';
import { referenceRows } from '@/lib/reference/reference-rows';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';

const pages = methodPages();
const entries = pages.flatMap((page) => page.files.flatMap((file) => file.entries));

/** Functions of a room that the engine and what stands on it import. */
function importedFrom(rooms: readonly string[], by: readonly string[]): string[] {
  const found = new Set<string>();
  for (const file of by.flatMap(filesOf)) {
    for (const node of parseSource(file).tree.statements.filter(ts.isImportDeclaration)) {
      const from = node.moduleSpecifier.getText().slice(1, -1).replace('@/', '');
      const bindings = node.importClause?.namedBindings;
      if (!rooms.some((room) => from.startsWith(room)) || !bindings || !ts.isNamedImports(bindings)) continue;
      for (const { name, isTypeOnly } of bindings.elements) {
        if (!isTypeOnly && !node.importClause?.isTypeOnly && /^[a-z]/.test(name.text)) {
          found.add(`${from}.ts#${name.text}`);
        }
      }
    }
  }
  return [...found];
}

describe('the method pages', () => {
  it('show every function of physics and sun that the engine uses', () => {
    const shown = new Set(entries.map(({ file, name }) => `${file}#${name}`));
    const used = importedFrom(
      ['lib/physics/', 'lib/sun/'],
      ['lib/simulation', 'lib/checks', 'lib/economics', 'lib/physics', 'lib/sun'],
    );
    expect(used.length).toBeGreaterThan(40);
    const silent = used.filter(
      (name) => !shown.has(name) && !WITHOUT_EQUATIONS.includes(name.split('#')[0]!),
    );
    expect(silent).toEqual([]);
  });

  it('name a source at every quantity', () => {
    const rooms = /^lib\/(physics|sun|economics)\//;
    const open = entries.filter(({ file, name, numeric, sources }) => {
      return rooms.test(file) && !name.includes('.') && numeric && sources.length === 0;
    });
    expect(open.map(({ name }) => name)).toEqual([]);
  });

  it('print each check beside a function that it calls', () => {
    const printed = new Set(entries.flatMap(({ checks }) => checks.map(({ id }) => id)));
    expect(referenceRows.filter(({ id }) => !printed.has(id)).map(({ id }) => id)).toEqual([]);
  });

  it('hold only checks within their tolerance', () => {
    const outside = entries.flatMap(({ checks }) => checks.filter(({ within }) => !within));
    expect(outside.map(({ id }) => id)).toEqual([]);
  });

  it('use each anchor once on a page', () => {
    for (const { topic, files } of pages) {
      const names = files.flatMap((file) => file.entries.map(({ name }) => name));
      expect(new Set(names).size, topic.id).toBe(names.length);
    }
  });

  it.each(TOPICS.map(({ id }) => id))('%s renders with its equations', async (topic) => {
    const html = renderToStaticMarkup(await TopicPage({ params: Promise.resolve({ topic }) }));
    const page = pages.find((one) => one.topic.id === topic)!;
    expect(page.entryCount).toBeGreaterThan(0);
    for (const { name } of page.files.flatMap((file) => file.entries)) expect(html).toContain(`id="${name}"`);
  });

  it('render beside them: contents, choices, limits, changes', () => {
    expect(renderToStaticMarkup(<MethodIndexPage />)).toContain('/method/collector');
    expect(renderToStaticMarkup(<ChoicesPage />)).toContain('Thermostat');
    expect(renderToStaticMarkup(<LimitsPage />)).toContain('ISO 52016-1');
    expect(renderToStaticMarkup(<ChangesPage />)).toContain(ENGINE_VERSION);
  });
});

describe('choices', () => {
  it.each(CHOICES.map((choice) => [choice.subject, choice] as const))(
    '%s: its files exist and its numbers are in them',
    (_, { text, fixedIn }) => {
      const root = path.resolve(import.meta.dirname, '../..');
      expect(fixedIn.filter((file) => !existsSync(path.join(root, file)))).toEqual([]);
      expect(withNumbers(text, fixedIn)).not.toMatch(/[{}]/);
    },
  );
});

describe('results that change', () => {
  it('tell what the present engine moved', () => {
    expect(CHANGES[0]!.version).toBe(ENGINE_VERSION);
    expect(CHANGES.every(({ version }) => /^\d+\.\d+\.\d+$/.test(version))).toBe(true);
    expect(CHANGES.every(({ moves }) => moves.length > 0)).toBe(true);
  });
});
