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
  run: (output: Output) => Promise<void>;
}

interface Output {
  /** What it printed, while nobody watches; shown once it has ended. */
  text: string;
}

/** Runs a program; what it says when it fails is the reason. */
function program(name: string, args: string[], output?: Output): Promise<void> {
  return new Promise((resolve, reject) => {
    const stdio = output === undefined ? 'inherit' : 'pipe';
    const child = spawn(bin(name), args, { cwd: ROOT, stdio: ['ignore', stdio, stdio] });
    for (const stream of [child.stdout, child.stderr]) {
      stream?.setEncoding('utf8').on('data', (chunk: string) => {
        if (output !== undefined) output.text += chunk;
      });
    }
    child.once('error', reject);
    child.once('close', (code) =>
      code === 0 ? resolve() : reject(new Error(`${name} ended with ${code}`)),
    );
  });
}

const FORMAT: Check = {
  name: 'format',
  run: (output) => program('prettier', ['--check', '--log-level', 'warn', '.'], output),
};
const TYPES: Check = { name: 'types', run: (output) => program('tsc', ['--noEmit'], output) };
const LINT: Check = {
  name: 'lint',
  run: (output) => program('eslint', ['--max-warnings', '0', '.'], output),
};
const BUILD: Check = {
  name: 'build',
  // The browser tests run on the app as it is served, not on a development server.
  run: async () => {
    await buildWeb();
  },
};

/** Each lane keeps one core busy: linting takes about as long as all the others together. */
const LANES: readonly (readonly Check[])[] = [[LINT], [BUILD, FORMAT, TYPES]];

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

/** Runs one check; its outcome in a line, with what it printed above it. */
async function runCheck({ name, run }: Check): Promise<{ isPassed: boolean; outcome: string }> {
  const started = performance.now();
  const output: Output = { text: '' };
  const fault = await run(output).then(
    () => null,
    (error: unknown) => (error instanceof Error ? error : new Error(String(error))),
  );
  const seconds = ((performance.now() - started) / 1000).toFixed(0);
  if (output.text !== '') console.log(output.text.trimEnd());
  if (fault !== null) console.error(fault.message);
  const outcome = `${name} ${fault === null ? 'passed' : 'failed'} (${seconds} s)`;
  console.log(outcome);
  return { isPassed: fault === null, outcome };
}

async function runAll(): Promise<void> {
  const totals: Totals = { passed: 0, failed: 0 };
  const outcomes: string[] = [];
  await Promise.all(
    LANES.map(async (lane) => {
      for (const check of lane) {
        const { isPassed, outcome } = await runCheck(check);
        totals[isPassed ? 'passed' : 'failed'] += 1;
        outcomes.push(outcome);
      }
    }),
  );
  const tests = await runTests(process.argv.slice(2));
  outcomes.push(`tests: ${tests.passed} passed, ${tests.failed} failed`);
  console.log(`\n${outcomes.join('\n')}`);
  console.log(`${totals.passed + tests.passed} passed, ${totals.failed + tests.failed} failed`);
  process.exitCode = totals.failed + tests.failed === 0 ? 0 : 1;
}

await runAll();
