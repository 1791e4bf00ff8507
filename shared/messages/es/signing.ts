import type { signing as en } from '../en/signing';
import type { Words } from '../words';

export const signing: Words<typeof en> = {};
