import type { findings as en } from '../en/findings';
import type { Words } from '../words';

export const findings: Words<typeof en> = {};
