import type { insights as en } from '../en/insights';
import type { Words } from '../words';

export const insights: Words<typeof en> = {};
