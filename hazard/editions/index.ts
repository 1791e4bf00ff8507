import { nfpa70e2024 } from './nfpa70e2024';
import type { Edition } from './types';

/** Every edition that a worksheet may have been assessed under, by the id it keeps. */
export const EDITIONS: Readonly<Record<string, Edition>> = { [nfpa70e2024.id]: nfpa70e2024 };

export { nfpa70e2024 };
