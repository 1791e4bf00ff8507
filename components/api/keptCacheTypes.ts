/** What was last shown to a person, kept on the device for a basement without signal. */
export interface KeptCache {
  read(userId: string): Promise<unknown>;
  write(userId: string, state: unknown): Promise<void>;
  forget(userId: string): Promise<void>;
}
