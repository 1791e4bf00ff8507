import { useEffect, useLayoutEffect } from 'react';

let kept: { key: string; y: number } | undefined;

/** Remembers how far down the list is, for when it is shown again. */
export function keepListPlace(key: string): void {
  kept = { key, y: window.scrollY };
}

/** Puts the list back where it was left, once. */
export function useListPlace(key: string, ready: boolean): void {
  useLayoutEffect(() => {
    if (!ready || kept?.key !== key) return undefined;
    const { y } = kept;
    kept = undefined;
    const frame = requestAnimationFrame(() => window.scrollTo(0, y));
    return () => cancelAnimationFrame(frame);
  }, [key, ready]);
}

/** A record that covers the list starts at its top. */
export function useTopOf(record: string): void {
  useEffect(() => {
    // Newer browsers answer a promise here, which is no clean-up.
    void window.scrollTo(0, 0);
  }, [record]);
}
