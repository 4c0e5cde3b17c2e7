import localFont from 'next/font/local';

/*
 * One call per subset file: a family per file, chained in globals.css, so that a browser fetches the
 * Greek or the extended Latin file only for a page that needs it. No size-adjusted system fallback stands
 * between them, or it would answer first. The loader wants literal arguments, hence the repetition.
 */

const alegreya = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/alegreya/files/alegreya-latin-wght-normal.woff2',
      style: 'normal',
      weight: '400 900',
    },
    {
      path: '../node_modules/@fontsource-variable/alegreya/files/alegreya-latin-wght-italic.woff2',
      style: 'italic',
      weight: '400 900',
    },
  ],
  variable: '--font-alegreya',
  adjustFontFallback: false,
});

const alegreyaExtended = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/alegreya/files/alegreya-latin-ext-wght-normal.woff2',
      style: 'normal',
      weight: '400 900',
    },
    {
      path: '../node_modules/@fontsource-variable/alegreya/files/alegreya-latin-ext-wght-italic.woff2',
      style: 'italic',
      weight: '400 900',
    },
  ],
  variable: '--font-alegreya-ext',
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02FF, U+1E00-1EFF, U+20A0-20AB, U+20AD-20C0' }],
});

const alegreyaGreek = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/alegreya/files/alegreya-greek-wght-normal.woff2',
      style: 'normal',
      weight: '400 900',
    },
    {
      path: '../node_modules/@fontsource-variable/alegreya/files/alegreya-greek-wght-italic.woff2',
      style: 'italic',
      weight: '400 900',
    },
  ],
  variable: '--font-alegreya-greek',
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0370-03FF' }],
});

const sourceSans = localFont({
  src: [
    {
      path: '../node_modules/@fontsource-variable/source-sans-3/files/source-sans-3-latin-wght-normal.woff2',
      style: 'normal',
      weight: '200 900',
    },
    {
      path: '../node_modules/@fontsource-variable/source-sans-3/files/source-sans-3-latin-wght-italic.woff2',
      style: 'italic',
      weight: '200 900',
    },
  ],
  variable: '--font-source-sans',
  adjustFontFallback: false,
});

const sourceSansExtended = localFont({
  src: '../node_modules/@fontsource-variable/source-sans-3/files/source-sans-3-latin-ext-wght-normal.woff2',
  weight: '200 900',
  variable: '--font-source-sans-ext',
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0100-02FF, U+1E00-1EFF, U+20A0-20AB, U+20AD-20C0' }],
});

const sourceSansGreek = localFont({
  src: '../node_modules/@fontsource-variable/source-sans-3/files/source-sans-3-greek-wght-normal.woff2',
  weight: '200 900',
  variable: '--font-source-sans-greek',
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: 'unicode-range', value: 'U+0370-03FF' }],
});

/** The signs that the other two lack: ≤ ≥ → and their like. */
const signs = localFont({
  src: '../node_modules/@fontsource-variable/ysabeau-office/files/ysabeau-office-math-wght-normal.woff2',
  weight: '1 1000',
  variable: '--font-signs',
  adjustFontFallback: false,
  preload: false,
  declarations: [{ prop: 'unicode-range', value: 'U+2070-209C, U+2190-2193, U+2200-22FF' }],
});

/** Class names that put every font variable of globals.css on the element that carries them. */
export const fontVariables = [
  alegreya,
  alegreyaExtended,
  alegreyaGreek,
  sourceSans,
  sourceSansExtended,
  sourceSansGreek,
  signs,
]
  .map((font) => font.variable)
  .join(' ');
