/**
 * Ends with 1 when `node_modules` is not what the lock file asks for. npm keeps
 * a list of what it put there; packages that are optional (other systems) may
 * be missing. Plain JavaScript: it runs before anything is installed.
 */
import { readFileSync } from 'node:fs';

const read = (file) => JSON.parse(readFileSync(file, 'utf8')).packages;

try {
  const wanted = read('package-lock.json');
  const present = read('node_modules/.package-lock.json');
  const stale = Object.entries(wanted).some(
    ([name, { version, optional, devOptional, peer }]) =>
      name !== '' &&
      present[name]?.version !== version &&
      !(present[name] === undefined && (optional || devOptional || peer)),
  );
  process.exit(stale ? 1 : 0);
} catch {
  process.exit(1);
}
