import type { archive as en } from '../en/archive';
import type { Words } from '../words';

export const archive: Words<typeof en> = {};
