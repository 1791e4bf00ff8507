const LOOPBACK = /^(localhost|127(\.\d{1,3}){3}|\[?::1\]?)$/;

/** True where nothing outside this machine can reach the host. */
export function isLoopback(host: string): boolean {
  return LOOPBACK.test(host);
}
