import type { caution as en } from '../en/caution';
import type { Words } from '../words';

export const caution: Words<typeof en> = {};
