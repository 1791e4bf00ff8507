import type { Facts } from './facts';

/**
 * Whether a meter touches conductors: always with the circuit off, for the
 * absence test, and in testing unless it is only looked at.
 */
export function usesMeter({ answers, path }: Facts): boolean {
  if (path === 'off') return true;
  const { task } = answers.job;
  return path === 'testing' && task !== 'inspect' && task !== 'thermography';
}
