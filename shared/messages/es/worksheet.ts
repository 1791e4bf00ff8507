import type { worksheet as en } from '../en/worksheet';
import type { Words } from '../words';

export const worksheet: Words<typeof en> = {};
