import type { Colour, Palette, PaletteName } from './cuts';

const NAMES: readonly PaletteName[] = ['paper', 'ink', 'sun', 'store', 'backup', 'hot', 'pebble'];

/** The stones' colours as the page has them now, light or dark. */
export function readPalette(element: Element): Palette {
  const style = getComputedStyle(element);
  const entries = NAMES.map((name) => [name, hexColour(style.getPropertyValue(`--color-${name}`))] as const);
  return Object.fromEntries(entries) as Record<PaletteName, Colour>;
}

/** "#f5f0e6" or "#fff" to numbers; black where it is neither. */
export function hexColour(text: string): Colour {
  const digits = text.trim().replace('#', '');
  const full = digits.length === 3 ? [...digits].map((digit) => digit + digit).join('') : digits;
  const value = /^[0-9a-f]{6}$/i.test(full) ? Number.parseInt(full, 16) : 0;
  return [value >> 16, (value >> 8) & 255, value & 255];
}

/** Calls back when the page turns light, dark or to paper; returns the way to stop. */
export function watchPalette(onChange: () => void): () => void {
  const queries = ['(prefers-color-scheme: dark)', 'print'].map((query) => window.matchMedia(query));
  queries.forEach((query) => query.addEventListener('change', onChange));
  const observer = new MutationObserver(onChange);
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['data-theme'] });
  return () => {
    queries.forEach((query) => query.removeEventListener('change', onChange));
    observer.disconnect();
  };
}
