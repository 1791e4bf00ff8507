/**
 * Where a form that is not a draft of the plan is kept until it is recorded: a
 * test for absence of voltage, a close-out, a stop without signal. Keyed by
 * the signed-in person, like the drafts.
 */
export interface KeptForms {
  read(userId: string, key: string): Promise<unknown>;
  /** The keys of one person's forms. */
  list(userId: string): Promise<string[]>;
  keep(userId: string, key: string, form: unknown): Promise<void>;
  forget(userId: string, key: string): Promise<void>;
}
