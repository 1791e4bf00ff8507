import type { pdf as en } from '../en/pdf';
import type { Words } from '../words';

export const pdf: Words<typeof en> = {};
