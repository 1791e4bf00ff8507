import type { verify as en } from '../en/verify';
import type { Words } from '../words';

export const verify: Words<typeof en> = {};
