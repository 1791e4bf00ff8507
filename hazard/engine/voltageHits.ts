import type { Finding } from '../types';
import type { Reading } from './readings';
import type { Hit } from './rule';

/** A finding for each governing reading whose magnitude a rule refuses. */
export function voltageHits(
  readings: readonly Reading[],
  isRefused: (magnitude: number) => boolean,
): readonly Hit[] {
  return readings.flatMap(({ index, volts, point, from, to, current, sourceId }) => {
    if (volts === undefined || !isRefused(Math.abs(volts))) return [];
    const params: Finding['params'] = { index, volts, current };
    for (const [name, value] of Object.entries({ point, from, to, sourceId })) {
      if (value !== undefined) params[name] = value;
    }
    return [{ path: `/proof/readings/${index}`, params }];
  });
}
