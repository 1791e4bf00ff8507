import { migrateUp } from '../migrate';
import { command, StartFault, withDatabase } from './environment';

command(() =>
  withDatabase(async () => {
    const { DATABASE_OWNER_URL: ownerUrl, DATABASE_URL: runtimeUrl } = process.env;
    if (!ownerUrl || !runtimeUrl) throw new StartFault('Set DATABASE_OWNER_URL and DATABASE_URL.');
    const names = await migrateUp({ ownerUrl, runtimeUrl });
    console.log(names.length === 0 ? 'Nothing to migrate.' : names.join('\n'));
  }),
);
