import type { fields as en } from '../en/fields';
import type { Words } from '../words';

export const fields: Words<typeof en> = {};
