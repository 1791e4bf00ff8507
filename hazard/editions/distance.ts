import type { Distance } from '../types';

/** A published pair: inches and metres as printed. */
export const at = (inches: number, metres: number): Distance => ({ inches, metres });
