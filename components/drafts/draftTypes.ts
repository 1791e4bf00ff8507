/**
 * Where what was typed is kept on this device until the server has it.
 *
 * Keyed by the signed-in person, so that a phone handed over never shows one
 * person's unsent work to another. This file serves the native targets;
 * `draftStore.web.ts` keeps the same promises in IndexedDB.
 */
export interface KeptDraft {
  worksheetId: string;
  /** The form's values as typed, also those that are not sensible yet. */
  raw: unknown;
  /** The version of the worksheet that the values were typed over. */
  baseVersion: number;
  /** ISO date-time of the last keystroke. */
  keptAt: string;
}

export interface DraftStore {
  read(userId: string, worksheetId: string): Promise<KeptDraft | undefined>;
  list(userId: string): Promise<KeptDraft[]>;
  keep(userId: string, draft: KeptDraft): Promise<void>;
  forget(userId: string, worksheetId: string): Promise<void>;
}
