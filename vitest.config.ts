import path from 'node:path';
import { defineConfig } from 'vitest/config';

const alias = [{ find: /^@\//, replacement: `${import.meta.dirname}/` }];

/** A zone far from UTC, so that a date worked out in the wrong zone fails here first. */
process.env.TZ = 'America/Chicago';

export default defineConfig({
  test: {
    // One worker for each core: left to itself, vitest keeps one core free.
    maxWorkers: '100%',
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'hazard',
          include: ['tests/{hazard,shared}/**/*.test.ts'],
          environment: 'node',
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'server',
          include: ['tests/server/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/globalSetup.ts'],
          setupFiles: ['tests/support/serverSetup.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
        },
      },
      {
        resolve: {
          alias: [
            { find: /^react-native$/, replacement: 'react-native-web' },
            {
              find: /^react-native-svg$/,
              replacement: path.resolve(
                import.meta.dirname,
                'node_modules/react-native-svg/lib/module/ReactNativeSVG.web.js',
              ),
            },
            ...alias,
          ],
          extensions: [
            '.web.tsx',
            '.web.ts',
            '.web.js',
            '.tsx',
            '.ts',
            '.jsx',
            '.js',
            '.mjs',
            '.json',
          ],
        },
        define: { __DEV__: 'true' },
        test: {
          name: 'components',
          testTimeout: 30_000,
          include: ['tests/components/**/*.test.{ts,tsx}'],
          environment: 'jsdom',
          setupFiles: ['tests/support/componentsSetup.ts'],
          server: { deps: { inline: [/react-native/, /expo/] } },
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'e2e',
          include: ['tests/e2e/**/*.test.ts'],
          environment: 'node',
          globalSetup: ['tests/support/globalSetup.ts'],
          setupFiles: ['tests/support/serverSetup.ts'],
          testTimeout: 300_000,
          hookTimeout: 300_000,
          // After the others: each has a server and a browser beside it.
          sequence: { groupOrder: 1 },
        },
      },
    ],
    coverage: {
      provider: 'v8',
      include: ['hazard/**/*.ts', 'shared/**/*.ts'],
      exclude: ['**/types.ts', '**/content.ts'],
      reporter: ['text-summary', 'json-summary'],
      reportsDirectory: 'coverage',
      thresholds: { branches: 100 },
    },
  },
});
