import { useEffect } from 'react';
import { sendKeptStops } from './keptStops';

const AGAIN_MILLISECONDS = 30_000;

/** Wherever the app is open: a stop that was pressed without signal goes out as soon as there is some. */
export function useSendKeptStops(userId: string): void {
  useEffect(() => {
    // A browser that refuses storage keeps nothing to send.
    const run = () => void sendKeptStops(userId).catch(() => undefined);
    run();
    // `online` is not always told, such as on a network without a way out.
    const timer = setInterval(run, AGAIN_MILLISECONDS);
    globalThis.addEventListener?.('online', run);
    return () => {
      clearInterval(timer);
      globalThis.removeEventListener?.('online', run);
    };
  }, [userId]);
}
