import { useMemo } from 'react';
import type { Site } from '@/shared/register';
import { useSites } from '../worksheet/registerQueries';

/** Sites in the order in which a person looks for them. */
export function useSitesByName(): readonly Site[] {
  const sites = useSites();
  return useMemo(
    () => [...sites].sort((one, other) => one.name.localeCompare(other.name)),
    [sites],
  );
}
