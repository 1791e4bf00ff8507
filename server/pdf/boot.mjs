// A worker thread does not inherit the loader of its parent on Node 20: it registers it itself.
import { register } from 'tsx/esm/api';

register();
await import('./worker.ts');
