import type { Config } from 'tailwindcss';

/** Which files are scanned for class names. The design tokens stand in `@theme` in app/globals.css. */
export default {
  content: ['./app/**/*.{ts,tsx}', './components/**/*.{ts,tsx}'],
} satisfies Config;
