import { defineConfig } from 'vitest/config';

process.env.TZ = 'America/Chicago';

/** Only the tests of hazard: the others ask for a database or a browser, once for each mutant. */
export default defineConfig({
  resolve: { alias: [{ find: /^@\//, replacement: `${import.meta.dirname}/` }] },
  test: {
    include: ['tests/hazard/**/*.test.ts'],
    environment: 'node',
    setupFiles: ['tests/support/propertyRuns.ts'],
  },
});
