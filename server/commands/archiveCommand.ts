import path from 'node:path';
import { parseArgs } from 'node:util';
import { DATA } from '../paths';
import { StartFault, withDatabase } from './environment';

interface Arguments {
  ownerUrl: string;
  file: string;
  replace: boolean;
}

/** The file of the command line, with the database and the files that the command works on. */
export async function withArchive(work: (options: Arguments) => Promise<void>): Promise<void> {
  const { values, positionals } = parseArgs({
    allowPositionals: true,
    options: { replace: { type: 'boolean', default: false } },
  });
  const [name] = positionals;
  if (name === undefined) throw new StartFault('Name the file: npm run db:backup -- FILE');
  // npm changes to the checkout; the file is meant from where the person stands.
  const file = path.resolve(process.env['INIT_CWD'] ?? process.cwd(), name);
  await withDatabase(() =>
    withFiles(async () => {
      const ownerUrl = process.env['DATABASE_OWNER_URL'];
      if (!ownerUrl) throw new StartFault('Set DATABASE_OWNER_URL.');
      await work({ ownerUrl, file, replace: values.replace });
    }),
  );
}

/** Attachments of this checkout, where no object store is named. */
export async function withFiles(work: () => Promise<void>): Promise<void> {
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
