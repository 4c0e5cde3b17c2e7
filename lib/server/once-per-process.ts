import 'server-only';

const KEY = Symbol.for('tepidarium.once-per-process');
const holder = globalThis as typeof globalThis & { [KEY]?: Map<string, unknown> };

/** One thing of its kind per process, although the bundler may load a module once for each of its bundles. */
export function oncePerProcess<T>(name: string, make: () => T): T {
  const things = (holder[KEY] ??= new Map<string, unknown>());
  if (!things.has(name)) things.set(name, make());
  return things.get(name) as T;
}
