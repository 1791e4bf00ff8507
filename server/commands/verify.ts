import path from 'node:path';
import { parseArgs } from 'node:util';
import { DATA } from '../paths';
import { command, StartFault, withDatabase } from './environment';

const HASH = /^[0-9a-f]{64}$/;

function sealArgument(): string | undefined {
  const { values } = parseArgs({ options: { seal: { type: 'string' } } });
  if (values.seal !== undefined && !HASH.test(values.seal)) {
    throw new StartFault('--seal wants the 64 digits of a seal, as the mail to safety has them.');
  }
  return values.seal;
}

/** The files are part of what was signed; outside production they lie in this checkout. */
async function withFiles(work: () => Promise<void>): Promise<void> {
  if (process.env['S3_ENDPOINT'] || process.env['NODE_ENV'] === 'production') return work();
  const { startS3Fake } = await import('../fakes/s3');
  const files = await startS3Fake(path.join(DATA, 'files'));
  process.env['S3_ENDPOINT'] = files.url;
  try {
    await work();
  } finally {
    await files.stop();
  }
}

async function verify(): Promise<void> {
  const seal = sealArgument();
  const { verifyRecord } = await import('../services/verifyRecord');
  const { closeDatabase } = await import('../db');
  const { faults, counts } = await verifyRecord(seal).finally(closeDatabase);
  for (const { table, id, what } of faults) console.error(`${table} ${id}: ${what}`);
  const totals = Object.entries(counts).map(([name, count]) => `${name} ${count}`);
  console.log(totals.join(', '));
  if (faults.length > 0) {
    console.error(`${faults.length} faults.`);
    process.exitCode = 1;
    return;
  }
  console.log(
    seal === undefined ? 'Nothing was altered.' : `Nothing was altered up to seal ${seal}.`,
  );
}

command(() => withDatabase(() => withFiles(verify)));
