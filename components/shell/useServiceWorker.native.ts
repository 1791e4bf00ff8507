/** An installed app needs no worker to start without signal. */
export function useServiceWorker(): void {}
