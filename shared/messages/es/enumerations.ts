import type { enumerations as en } from '../en/enumerations';
import type { Words } from '../words';

export const enumerations: Words<typeof en> = {};
