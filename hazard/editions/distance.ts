import type { Distance } from '../types';

/** A published pair: inches and metres as printed. Frozen, because answers hand out the table's own. */
export const at = (inches: number, metres: number): Distance => Object.freeze({ inches, metres });
