import type { permit as en } from '../en/permit';
import type { Words } from '../words';

export const permit: Words<typeof en> = {};
