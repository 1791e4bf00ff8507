/** Small choices of this device, which must be known before the first paint. */
export const deviceStorage = {
  get(key: string): string | null {
    try {
      return window.localStorage.getItem(`wideberth.${key}`);
    } catch {
      // A browser may refuse storage altogether.
      return null;
    }
  },
  set(key: string, value: string | null): void {
    try {
      if (value === null) window.localStorage.removeItem(`wideberth.${key}`);
      else window.localStorage.setItem(`wideberth.${key}`, value);
    } catch {
      // The choice then lasts as long as the page.
    }
  },
};
