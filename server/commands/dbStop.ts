import { runningCluster, stopCluster } from './cluster';
import { command } from './environment';

command(async () => {
  const cluster = await runningCluster();
  if (cluster === null) return console.log('No database of this checkout is running.');
  await stopCluster(cluster.folder);
  console.log('The database is stopped.');
});
