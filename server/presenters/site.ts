import type { Site as SiteRecord } from '@/shared/register';
import type { Site } from '../models/Site';

/** A site; only safety also sees who belongs to it. */
export function presentSite(site: Site, memberIds?: string[]): SiteRecord {
  const { id, name, timeZone, address, systems, panels, emergency, deskToTell, retiredAt } = site;
  return {
    id,
    name,
    timeZone,
    address,
    systems,
    panels,
    emergency,
    deskToTell,
    ...(memberIds === undefined ? {} : { memberIds }),
    retired: retiredAt !== null,
  };
}
