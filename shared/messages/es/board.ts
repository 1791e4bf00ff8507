import type { board as en } from '../en/board';
import type { Words } from '../words';

export const board: Words<typeof en> = {};
