import { col, fn, where } from 'sequelize';
import { hashSecret } from '../argon';
import { clock } from '../clock';
import { transact } from '../db';
import { PasswordReset } from '../models/PasswordReset';
import { User } from '../models/User';
import { invalidField, notFound } from '../problem';
import { refuseCommon, setPassword } from './changeSecrets';
import { queueLinkMail } from './queueMail';
import { hashToken } from './sendMail';

/** Queues a link for an active account; for any other address it does nothing, and the answer is the same. */
export async function requestReset(email: string): Promise<void> {
  const user = await User.findOne({
    where: where(fn('lower', col('email')), email.trim().toLowerCase()),
  });
  if (user === null || user.retiredAt !== null) return;
  // Somebody who never joined gets the invitation again: their PIN is still to be chosen.
  const link = user.passwordHash === null ? 'invitation' : 'reset';
  await transact((transaction) => queueLinkMail(transaction, link, user.id));
}

interface Choice {
  password: string;
  pin?: string | undefined;
}

/** The link of a token, while it may be used; 404 otherwise, whatever else the request says. */
export async function findReset(token: string): Promise<PasswordReset> {
  const found = await PasswordReset.findByPk(hashToken(token));
  if (found === null || !isOpen(found)) throw notFound();
  return found;
}

/** Uses a link, once and within its hour. The PIN comes only with an invitation: a mailbox alone never yields it. */
export async function finishReset(found: PasswordReset, { password, pin }: Choice): Promise<void> {
  refuseCommon(password);
  const { tokenHash } = found;
  if (found.kind === 'reset' && pin !== undefined) {
    throw invalidField('#/pin', 'not-with-reset', 'A reset does not change the signing PIN.');
  }
  if (found.kind === 'invitation' && pin === undefined) {
    throw invalidField('#/pin', 'required', 'Choose a signing PIN.');
  }
  const passwordHash = await hashSecret(password);
  const pinHash = pin === undefined ? undefined : await hashSecret(pin);
  await transact(async (transaction) => {
    // The row decides between two uses at once.
    const reset = await PasswordReset.findByPk(tokenHash, {
      transaction,
      lock: transaction.LOCK.UPDATE,
    });
    if (reset === null || !isOpen(reset)) throw notFound();
    const user = await User.findByPk(reset.userId, {
      transaction,
      lock: transaction.LOCK.UPDATE,
      rejectOnEmpty: true,
    });
    if (user.retiredAt !== null) throw notFound();
    // An invitation that was overtaken by another sets no second PIN.
    if (pinHash !== undefined && user.pinHash === null) {
      await user.update({ pinHash }, { transaction });
    }
    await setPassword(user.id, passwordHash, transaction);
  });
}

function isOpen({ usedAt, expiresAt }: PasswordReset): boolean {
  return usedAt === null && expiresAt > clock.now();
}
