import { useEffect } from 'react';

/**
 * Registers the worker that keeps the app on the device. A new one waits until
 * every tab is closed: code is never swapped under an open form.
 */
export function useServiceWorker(): void {
  useEffect(() => {
    if (process.env.NODE_ENV !== 'production' || !('serviceWorker' in navigator)) return;
    navigator.serviceWorker.register('/sw.js').catch(() => undefined);
  }, []);
}
