import type { register as en } from '../en/register';
import type { Words } from '../words';

export const register: Words<typeof en> = {};
