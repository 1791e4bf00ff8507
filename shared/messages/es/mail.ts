import type { mail as en } from '../en/mail';
import type { Words } from '../words';

export const mail: Words<typeof en> = {};
