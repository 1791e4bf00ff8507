import type { Request } from 'express';
import type { Locale, Role, ThemeChoice, Units } from '@/shared/user';
import { notSignedIn } from './problem';

/** The signed-in person, read afresh from the register at every request. */
export interface CurrentUser {
  id: string;
  name: string;
  email: string;
  role: Role;
  qualifiedThrough: string | null;
  siteIds: string[];
  locale: Locale;
  units: Units;
  theme: ThemeChoice;
  hasPin: boolean;
}

declare global {
  // eslint-disable-next-line @typescript-eslint/no-namespace -- Passport declares its user here.
  namespace Express {
    // eslint-disable-next-line @typescript-eslint/no-empty-object-type -- One shape, named twice.
    interface User extends CurrentUser {}
  }
}

/** The person of this request; 401 where nobody is signed in. */
export function currentUser(req: Request): CurrentUser {
  if (req.user === undefined) throw notSignedIn();
  return req.user;
}
