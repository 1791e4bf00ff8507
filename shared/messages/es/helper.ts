import type { helper as en } from '../en/helper';
import type { Words } from '../words';

export const helper: Words<typeof en> = {};
