import { command, ownerUrl, StartFault } from './environment';

command(async () => {
  const url = await ownerUrl();
  if (url === null) throw new StartFault('No database is running. Start one: npm start');
  console.log(url);
});
