import { parseArgs } from 'node:util';
import { withFiles } from './archiveCommand';
import { command, StartFault, withDatabase } from './environment';

const HASH = /^[0-9a-f]{64}$/;

function sealArgument(): string | undefined {
  const { values } = parseArgs({ options: { seal: { type: 'string' } } });
  if (values.seal !== undefined && !HASH.test(values.seal)) {
    throw new StartFault('--seal wants the 64 digits of a seal, as the mail to safety has them.');
  }
  return values.seal;
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
