import { tz } from '@date-fns/tz';
import { format } from 'date-fns';
import type { Person, SessionUser } from '@/shared/user';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import type { User } from '../models/User';

export function presentSessionUser({
  id,
  name,
  email,
  role,
  qualifiedThrough,
  siteIds,
  locale,
  units,
  theme,
  hasPin,
}: CurrentUser): SessionUser {
  return { id, name, email, role, qualifiedThrough, siteIds, locale, units, theme, hasPin };
}

/** Today, `YYYY-MM-DD`, on the calendar of a zone. */
export function todayIn(timeZone: string): string {
  return format(clock.now(), 'yyyy-MM-dd', { in: tz(timeZone) });
}

export interface PersonPlaces {
  siteIds: string[];
  timeZone: string;
}

/** A person as anybody of the same sites sees them. */
export function presentPerson(
  { id, name, role, qualifiedThrough }: User,
  { timeZone }: PersonPlaces,
): Person {
  const qualified = qualifiedThrough !== null && qualifiedThrough >= todayIn(timeZone);
  return { id, name, role, qualified, qualifiedThrough };
}

/** A person as the safety office keeps them. */
export function presentPersonInFull(user: User, places: PersonPlaces): Person {
  const { email, locale, units, pinHash, invitedAt, retiredAt, createdAt } = user;
  return {
    ...presentPerson(user, places),
    email,
    siteIds: places.siteIds,
    locale,
    units,
    hasPin: pinHash !== null,
    invitedAt: invitedAt?.toISOString() ?? null,
    retired: retiredAt !== null,
    createdAt: createdAt.toISOString(),
  };
}
