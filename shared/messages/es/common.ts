import type { common as en } from '../en/common';
import type { Words } from '../words';

export const common: Words<typeof en> = {};
