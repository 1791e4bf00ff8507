import type { problems as en } from '../en/problems';
import type { Words } from '../words';

export const problems: Words<typeof en> = {};
