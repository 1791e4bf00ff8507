import { existsSync } from 'node:fs';
import { withArchive } from './archiveCommand';
import { command, StartFault } from './environment';

command(() =>
  withArchive(async ({ ownerUrl, file, replace }) => {
    if (!existsSync(file)) throw new StartFault(`There is no file ${file}`);
    const { restore } = await import('./archive');
    await restore(ownerUrl, file, { replace });
    console.log('Restored. Check it: npm run verify');
  }),
);
