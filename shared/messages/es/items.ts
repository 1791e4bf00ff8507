import type { items as en } from '../en/items';
import type { Words } from '../words';

export const items: Words<typeof en> = {};
