import { performance } from 'node:perf_hooks';
import { assess } from '@/hazard';
import { benchContent, benchProof } from './benchWorksheet';

const WARM_UP_ROUNDS = 200;
const SAMPLES = 30;
const ROUNDS = 50;

/** The median of several samples, in microseconds a round: one slow sample moves it little. */
function medianMicroseconds(run: () => unknown): number {
  for (let round = 0; round < WARM_UP_ROUNDS; round += 1) run();
  const samples = Array.from({ length: SAMPLES }, () => {
    const start = performance.now();
    for (let round = 0; round < ROUNDS; round += 1) run();
    return ((performance.now() - start) / ROUNDS) * 1000;
  });
  samples.sort((a, b) => a - b);
  return samples[Math.floor(SAMPLES / 2)] ?? Number.NaN;
}

const print = (line: string) => process.stdout.write(`${line}\n`);

/**
 * The assessment runs at every keystroke of a form. Its time is given beside
 * that of parsing the same content in the same run, which says more than
 * microseconds of a machine that nobody else has.
 */
function benchAssess(): void {
  const text = JSON.stringify({ content: benchContent, proof: benchProof });
  const options = { on: '2026-12-01T09:00:00-06:00', stage: 'work', proof: benchProof } as const;
  const parse = medianMicroseconds(() => JSON.parse(text) as unknown);
  const assessed = medianMicroseconds(() => assess(benchContent, options));
  print(`JSON.parse of a full worksheet (${text.length} characters): ${parse.toFixed(1)} µs`);
  print(`assess of the same worksheet: ${assessed.toFixed(1)} µs`);
  print(`assess / JSON.parse: ${(assessed / parse).toFixed(2)}`);
}

benchAssess();
