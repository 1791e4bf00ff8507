import { withArchive } from './archiveCommand';
import { command } from './environment';

command(() =>
  withArchive(async ({ ownerUrl, file }) => {
    const { backUp } = await import('./archive');
    await backUp(ownerUrl, file);
    console.log(`The backup is in ${file}`);
  }),
);
