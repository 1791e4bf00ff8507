import { execFile } from 'node:child_process';
import { promisify } from 'node:util';
import { expect, it } from 'vitest';
import { seedDemo } from '@/server/demo/seed';
import { Worksheet } from '@/server/models/Worksheet';
import { verifyRecord } from '@/server/services/verifyRecord';

const run = promisify(execFile);
const COUNT = Number(process.env['SEED_LARGE_COUNT'] ?? 500);

const seedLarge = (count: number) =>
  run(process.execPath, ['--import', 'tsx', 'server/commands/seedLarge.ts', String(count)]);

it('fills the archive with worksheets whose hashes all hold, also a second time', async () => {
  await seedDemo({ worksheets: 'none' });
  await seedLarge(COUNT);
  await seedLarge(20);
  expect(await Worksheet.count({ where: { state: 'closed' } })).toBe(COUNT + 20);
  const { faults, counts } = await verifyRecord();
  expect(faults).toEqual([]);
  expect(counts['worksheets']).toBe(COUNT + 20);
  const ready = await Worksheet.count({ where: { verdict: 'ready' } });
  // Nobody tested or signed these: none of them claims to have been ready.
  expect(ready).toBe(0);
}, 240_000);
