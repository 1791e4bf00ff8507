import type { topics as en } from '../en/topics';
import type { Words } from '../words';

export const topics: Words<typeof en> = {};
