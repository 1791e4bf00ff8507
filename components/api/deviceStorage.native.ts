const kept = new Map<string, string>();

/** Small choices of this device; on a phone app they last as long as it runs, the account keeps the rest. */
export const deviceStorage = {
  get(key: string): string | null {
    return kept.get(key) ?? null;
  },
  set(key: string, value: string | null): void {
    if (value === null) kept.delete(key);
    else kept.set(key, value);
  },
};
