import type { WorksheetState } from '@/shared/record';
import type { CurrentUser } from '../currentUser';
import type { Worksheet } from '../models/Worksheet';

/*
 * Who may see a worksheet and act on it. State, hash and verdict are judged
 * later, by the services: these answer 404 and 403.
 */

type Seen = Pick<
  Worksheet,
  'leadId' | 'createdById' | 'crewIds' | 'signedCrewIds' | 'siteId' | 'authorIds'
>;
type Person = Pick<CurrentUser, 'id' | 'role' | 'siteIds'>;

/** "Own": its lead, its creator, or named in the crew of the current or any signed revision. */
export function isOwn(person: Person, worksheet: Seen): boolean {
  const { leadId, createdById, crewIds, signedCrewIds } = worksheet;
  return [leadId, createdById, ...crewIds, ...signedCrewIds].includes(person.id);
}

export function isSupervisorOfSite(person: Person, { siteId }: Pick<Seen, 'siteId'>): boolean {
  return person.role === 'supervisor' && siteId !== null && person.siteIds.includes(siteId);
}

export function mayRead(person: Person, worksheet: Seen): boolean {
  return (
    person.role === 'safety' || isSupervisorOfSite(person, worksheet) || isOwn(person, worksheet)
  );
}

export function mayCreate({ role }: Person): boolean {
  return role === 'lead' || role === 'supervisor';
}

export function isLead(person: Pick<Person, 'id'>, { leadId }: Pick<Seen, 'leadId'>): boolean {
  return leadId === person.id;
}

/** A copy begins a worksheet: its lead copies it, if they may still begin one. */
export function mayCopy(person: Person, worksheet: Seen): boolean {
  return isLead(person, worksheet) && mayCreate(person);
}

/** The lead counts as crew also while the content does not name them. */
export function isCrew(
  person: Pick<Person, 'id'>,
  { leadId, crewIds }: Pick<Seen, 'leadId' | 'crewIds'>,
): boolean {
  return leadId === person.id || crewIds.includes(person.id);
}

/** A supervisor of the site who is not on the crew and wrote nothing in it. */
export function mayCountersign(person: Person, worksheet: Seen): boolean {
  return (
    isSupervisorOfSite(person, worksheet) &&
    !isCrew(person, worksheet) &&
    !worksheet.authorIds.includes(person.id)
  );
}

/** Anyone who could sign anything in it; which meaning fits whom is judged with the body. */
export function maySign(person: Person, worksheet: Seen): boolean {
  return isCrew(person, worksheet) || isSupervisorOfSite(person, worksheet);
}

export function mayReturn(person: Person, worksheet: Seen): boolean {
  return isSupervisorOfSite(person, worksheet);
}

export function mayStop(person: Person, worksheet: Seen): boolean {
  return isCrew(person, worksheet) || isSupervisorOfSite(person, worksheet);
}

export function mayVoid(person: Person, worksheet: Seen): boolean {
  return isLead(person, worksheet) || isSupervisorOfSite(person, worksheet);
}

/** From which states each act is possible: the life of a worksheet. */
export const ACT_STATES = {
  save: ['draft'],
  prepared: ['draft'],
  acknowledged: ['briefing'],
  countersigned: ['countersign'],
  prove: ['in-force'],
  ask: ['draft', 'briefing', 'countersign', 'in-force'],
  answer: ['draft', 'briefing', 'countersign', 'in-force', 'returned', 'stopped'],
  return: ['briefing', 'countersign'],
  stop: ['briefing', 'countersign', 'in-force'],
  revise: ['returned', 'stopped', 'expired'],
  close: ['in-force', 'expired'],
  void: ['draft', 'briefing', 'countersign', 'returned', 'stopped'],
  attach: ['draft'],
  attachToCloseOut: ['in-force', 'expired'],
} as const satisfies Record<string, readonly WorksheetState[]>;
export type Act = keyof typeof ACT_STATES;

export function allows(state: WorksheetState, act: Act): boolean {
  return (ACT_STATES[act] as readonly WorksheetState[]).includes(state);
}
