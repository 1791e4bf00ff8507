import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { z } from 'zod';
import { DATA, ROOT } from '../paths';
import { buildWeb } from './buildWeb';

const REPORT = path.join(DATA, 'test-report.json');
const bin = (name: string) => path.join(ROOT, 'node_modules', '.bin', name);

interface Check {
  name: string;
  run: () => Promise<void>;
}

/** Runs a program with its output to the terminal; what it says when it fails is the reason. */
function program(name: string, args: string[]): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(bin(name), args, { cwd: ROOT, stdio: ['ignore', 'inherit', 'inherit'] });
    child.once('error', reject);
    child.once('exit', (code) =>
      code === 0 ? resolve() : reject(new Error(`${name} ended with ${code}`)),
    );
  });
}

const CHECKS: Check[] = [
  { name: 'format', run: () => program('prettier', ['--check', '--log-level', 'warn', '.']) },
  { name: 'types', run: () => program('tsc', ['--noEmit']) },
  { name: 'lint', run: () => program('eslint', ['--max-warnings', '0', '.']) },
  {
    name: 'build',
    // The browser tests run on the app as it is served, not on a development server.
    run: async () => {
      await buildWeb();
    },
  },
];

const reportSchema = z.object({
  numPassedTests: z.number(),
  numFailedTests: z.number(),
  numTotalTestSuites: z.number(),
  success: z.boolean(),
  testResults: z.array(
    z.object({ status: z.string(), assertionResults: z.array(z.unknown()), name: z.string() }),
  ),
});

interface Totals {
  passed: number;
  failed: number;
}

async function runTests(filters: string[]): Promise<Totals> {
  mkdirSync(DATA, { recursive: true });
  rmSync(REPORT, { force: true });
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${REPORT}`];
  const ended = await program('vitest', ['run', ...reporters, ...filters]).then(
    () => 0,
    () => 1,
  );
  try {
    const report = reportSchema.parse(JSON.parse(readFileSync(REPORT, 'utf8')));
    // A file that could not even be loaded has no test of its own to fail.
    const unloaded = report.testResults.filter(
      ({ status, assertionResults }) => status === 'failed' && assertionResults.length === 0,
    ).length;
    const failed = report.numFailedTests + unloaded;
    return { passed: report.numPassedTests, failed: failed === 0 ? ended : failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
}

async function runAll(): Promise<void> {
  const totals: Totals = { passed: 0, failed: 0 };
  const outcomes: string[] = [];
  for (const { name, run } of CHECKS) {
    const started = performance.now();
    const fault = await run().then(
      () => null,
      (error: unknown) => (error instanceof Error ? error : new Error(String(error))),
    );
    const seconds = ((performance.now() - started) / 1000).toFixed(0);
    if (fault !== null) console.error(fault.message);
    totals[fault === null ? 'passed' : 'failed'] += 1;
    outcomes.push(`${name} ${fault === null ? 'passed' : 'failed'} (${seconds} s)`);
    console.log(outcomes.at(-1));
  }
  const tests = await runTests(process.argv.slice(2));
  outcomes.push(`tests: ${tests.passed} passed, ${tests.failed} failed`);
  console.log(`\n${outcomes.join('\n')}`);
  console.log(`${totals.passed + tests.passed} passed, ${totals.failed + tests.failed} failed`);
  process.exitCode = totals.failed + tests.failed === 0 ? 0 : 1;
}

await runAll();
