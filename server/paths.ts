import path from 'node:path';

/** The checkout. */
export const ROOT = path.resolve(import.meta.dirname, '..');

/** What this checkout keeps for itself and git never sees. */
export const DATA = path.join(ROOT, '.data');
