import { defineConfig } from 'vitest/config';

export default defineConfig({
  resolve: {
    alias: {
      'server-only': `${import.meta.dirname}/tests/fakes/server-only.ts`,
      '@': import.meta.dirname,
    },
  },
  test: { include: ['tests/**/*.test.ts', 'tests/**/*.test.tsx'], pool: 'threads' },
});
