import type { Meaning } from '@/shared/record';
import type { CurrentUser } from '../currentUser';
import { User } from '../models/User';
import type { Worksheet } from '../models/Worksheet';
import { isCrew, mayCountersign } from '../policies/worksheet';
import { notAllowed, notFound } from '../problem';
import { loadCurrentUser } from './loadCurrentUser';

interface Relation {
  worksheet: Worksheet;
  meaning: Meaning;
  signerId: string;
}

async function isPossibleSupervisor(worksheet: Worksheet, signerId: string): Promise<boolean> {
  const signer = await loadCurrentUser(signerId);
  return signer !== null && mayCountersign(signer.user, worksheet);
}

/**
 * Whether this person may enter a signature of this meaning for this signer.
 * Who is not named for it is not found; who is named but not entitled, or not
 * in their own session, is not allowed.
 */
export async function checkSignatureRelation(
  actor: CurrentUser,
  { worksheet, meaning, signerId }: Relation,
): Promise<void> {
  const isOwnSession = signerId === actor.id;
  if (meaning === 'countersigned') {
    if (isOwnSession && mayCountersign(actor, worksheet)) return;
    if (isOwnSession) {
      throw notAllowed('A supervisor of the site who is not on the crew countersigns.');
    }
    if (await isPossibleSupervisor(worksheet, signerId)) {
      throw notAllowed('A supervisor countersigns in their own session.');
    }
    throw notFound();
  }
  if (!isCrew({ id: signerId }, worksheet)) throw notFound();
  if (meaning === 'prepared') {
    if (isOwnSession && signerId === worksheet.leadId) return;
    throw notAllowed('The lead prepares it, in their own session.');
  }
  if (signerId === worksheet.leadId) {
    throw notAllowed('The lead signs as lead; the others acknowledge.');
  }
  if (!isOwnSession && !isCrew(actor, worksheet)) {
    throw notAllowed('Only a member of the same crew hands over a device for this.');
  }
}

/** The signer as they stand in the register now. A retired person signs nothing. */
export async function loadSigner(signerId: string): Promise<User> {
  const signer = await User.findByPk(signerId);
  if (signer === null || signer.retiredAt !== null) throw notFound();
  return signer;
}
