import { buildWeb } from './buildWeb';
import { command } from './environment';

command(async () => {
  await buildWeb({ force: true });
  console.log('The web app is built.');
});
