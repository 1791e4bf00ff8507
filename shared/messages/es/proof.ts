import type { proof as en } from '../en/proof';
import type { Words } from '../words';

export const proof: Words<typeof en> = {};
