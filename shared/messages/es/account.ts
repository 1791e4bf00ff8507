import type { account as en } from '../en/account';
import type { Words } from '../words';

export const account: Words<typeof en> = {};
