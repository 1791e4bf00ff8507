import type { home as en } from '../en/home';
import type { Words } from '../words';

export const home: Words<typeof en> = {};
