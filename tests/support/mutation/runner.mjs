import { readdirSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';
import vm from 'node:vm';
import { declareClassPlugin, PluginKind } from '@stryker-mutator/api/plugin';
import {
  determineHitLimitReached,
  DryRunStatus,
  TestStatus,
  toMutantRunResult,
} from '@stryker-mutator/api/test-runner';
import { build } from 'esbuild';
import { collector } from './collectTests.mjs';

/** A table has a test file that is sure to notice a changed figure: those come first, what is slow last. */
const FIRST = /\/(editions|shock|arcFlashTable|gloves|order|meter|likelihood)\.test\.ts$/;
const LAST = /\/(unanswered|conductors|assessProperties|strictness|soundWorksheet)\.test\.ts$/;
const placeOf = (file) => (FIRST.test(file) ? 0 : LAST.test(file) ? 2 : 1);

function testFiles() {
  return readdirSync('tests/hazard', { recursive: true })
    .filter((file) => file.endsWith('.test.ts'))
    .map((file) => `./tests/hazard/${file}`)
    .sort((one, other) => placeOf(one) - placeOf(other) || (one < other ? -1 : 1));
}

/** All tests with the mutated module in one script that can be loaded again at once. */
async function bundle() {
  const { outputFiles } = await build({
    stdin: {
      contents: testFiles()
        .map((file) => `import '${file}';`)
        .join('\n'),
      resolveDir: process.cwd(),
    },
    bundle: true,
    write: false,
    platform: 'node',
    format: 'cjs',
    // Kept out of the bundle: loaded once, whatever the mutant.
    external: ['vitest', 'fast-check', 'mathjs'],
    logLevel: 'error',
  });
  return new vm.Script(`(function (require) {${outputFiles[0].text}\n})`);
}

/**
 * Runs the tests of `hazard/` inside Stryker's own process. Two thirds of the
 * mutants are tables and rules, made when the module is loaded, so that each
 * needs the module anew: here that takes a twentieth of a second, where a test
 * runner with its workers takes over two.
 */
class InProcessRunner {
  constructor() {
    this.require = createRequire(path.resolve('package.json'));
    this.stryker = globalThis.__stryker__ ??= {};
    /** Tests that noticed a mutant, the latest last: its neighbour is mostly noticed by the same. */
    this.killers = new Set();
  }

  capabilities() {
    return { reloadEnvironment: true };
  }

  async init() {
    process.env.TZ = 'America/Chicago';
    this.script = await bundle();
  }

  load() {
    const { tests, vitest } = collector();
    this.script.runInThisContext()((name) => (name === 'vitest' ? vitest : this.require(name)));
    this.tests = tests;
  }

  async dryRun() {
    this.stryker.activeMutant = undefined;
    this.load();
    const result = await this.run(this.tests, { bail: false });
    return { ...result, mutantCoverage: this.stryker.mutantCoverage };
  }

  async mutantRun({ activeMutant, testFilter, hitLimit, mutantActivation, reloadEnvironment }) {
    Object.assign(this.stryker, { hitLimit, hitCount: hitLimit === undefined ? undefined : 0 });
    const isStatic = mutantActivation === 'static';
    this.stryker.activeMutant = isStatic ? activeMutant.id : undefined;
    try {
      if (isStatic || reloadEnvironment || this.tests === undefined) this.load();
    } catch (error) {
      // A module that cannot be loaded fails every test.
      this.tests = undefined;
      const failed = { id: 'load', name: 'load', timeSpentMs: 0, status: TestStatus.Failed };
      const tests = [{ ...failed, failureMessage: String(error) }];
      return toMutantRunResult({ status: DryRunStatus.Complete, tests });
    }
    this.stryker.activeMutant = activeMutant.id;
    const wanted = testFilter && new Set(testFilter);
    const chosen = this.tests.filter(({ id }) => wanted?.has(id) ?? true);
    const result = await this.run(this.likelyKillersFirst(chosen), { bail: true });
    this.remember(result.tests.find(({ status }) => status === TestStatus.Failed)?.id);
    const timedOut = determineHitLimitReached(this.stryker.hitCount, hitLimit);
    return toMutantRunResult(timedOut ?? result);
  }

  likelyKillersFirst(tests) {
    const order = [...this.killers].reverse();
    const byId = new Map(tests.map((test) => [test.id, test]));
    const first = order.flatMap((id) => byId.get(id) ?? []);
    return [...first, ...tests.filter(({ id }) => !this.killers.has(id))];
  }

  remember(id) {
    if (id === undefined) return;
    this.killers.delete(id);
    this.killers.add(id);
  }

  async run(tests, { bail }) {
    const results = [];
    for (const { id, name, run } of tests) {
      this.stryker.currentTestId = id;
      const started = performance.now();
      const failureMessage = await Promise.resolve()
        .then(run)
        .then(
          () => undefined,
          (error) => String(error),
        );
      const timeSpentMs = performance.now() - started;
      const status = failureMessage === undefined ? TestStatus.Success : TestStatus.Failed;
      results.push({ id, name, timeSpentMs, status, failureMessage });
      if (bail && status === TestStatus.Failed) break;
    }
    this.stryker.currentTestId = undefined;
    return { status: DryRunStatus.Complete, tests: results };
  }
}

export const strykerPlugins = [
  declareClassPlugin(PluginKind.TestRunner, 'in-process', InProcessRunner),
];
