import { Op } from 'sequelize';
import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import { hashSecret, verifySecret } from '../argon';
import { clock } from '../clock';
import { isCommonPassword } from '../commonPasswords';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { Device } from '../models/Device';
import { PasswordReset } from '../models/PasswordReset';
import { User } from '../models/User';
import { invalidField, wrongPassword } from '../problem';
import { consume, signInLimiters } from '../throttle';
import { raiseEpoch } from './ownSessions';
import { queueMail } from './queueMail';
import { recordEvent } from './recordEvent';

/** 422 for a password that everybody guesses first. */
export function refuseCommon(password: string): void {
  if (!isCommonPassword(password)) return;
  throw invalidField('#/password', 'common', 'This password is on the list of common ones.');
}

/** The person's password again, counted like a sign-in: a borrowed session must not try passwords. */
export async function checkPassword(
  { id, email }: CurrentUser,
  password: string,
  pointer: string,
): Promise<void> {
  const key = email.toLowerCase().slice(0, 200);
  await consume(signInLimiters.account, key);
  const user = await User.findByPk(id, { rejectOnEmpty: true });
  if (!(await verifySecret(user.passwordHash, password))) throw wrongPassword(pointer);
  await signInLimiters.account.reward(key);
}

/** Changes the password; answers the epoch that the asking session takes on, all others have ended. */
export async function changePassword(
  actor: CurrentUser,
  { current, password }: { current: string; password: string },
): Promise<number> {
  refuseCommon(password);
  await checkPassword(actor, current, '#/current');
  const passwordHash = await hashSecret(password);
  return transact((transaction) => setPassword(actor.id, passwordHash, transaction));
}

/** Stores a new password, ends the person's sessions and open links, and tells them. */
export async function setPassword(
  userId: string,
  passwordHash: string,
  transaction: Transaction,
): Promise<number> {
  const user = await User.findByPk(userId, {
    transaction,
    lock: transaction.LOCK.UPDATE,
    rejectOnEmpty: true,
  });
  const now = clock.now();
  const isFirst = user.passwordHash === null;
  await user.update({ passwordHash, updatedAt: now }, { transaction });
  await PasswordReset.update(
    { usedAt: now },
    { where: { userId, usedAt: { [Op.is]: null } }, transaction },
  );
  const type = isFirst ? 'joined' : 'password-changed';
  await recordEvent(transaction, { subjectType: 'user', subjectId: userId, type, actorId: userId });
  if (!isFirst) {
    await queueMail(transaction, {
      recipient: user,
      about: `password-changed ${v7()}`,
      words: ({ passwordChanged }) => passwordChanged,
    });
  }
  return raiseEpoch(userId, transaction);
}

/** Changes the signing PIN; devices that signed with the old one are taken off. */
export async function changePin(
  actor: CurrentUser,
  { password, pin }: { password: string; pin: string },
): Promise<void> {
  await checkPassword(actor, password, '#/password');
  const pinHash = await hashSecret(pin);
  await transact(async (transaction) => {
    const user = await User.findByPk(actor.id, {
      transaction,
      lock: transaction.LOCK.UPDATE,
      rejectOnEmpty: true,
    });
    const now = clock.now();
    await user.update({ pinHash, updatedAt: now }, { transaction });
    await Device.update(
      { revokedAt: now },
      { where: { userId: actor.id, revokedAt: { [Op.is]: null } }, transaction },
    );
    await recordEvent(transaction, {
      subjectType: 'user',
      subjectId: actor.id,
      type: 'pin-changed',
      actorId: actor.id,
    });
    await queueMail(transaction, {
      recipient: user,
      about: `pin-changed ${v7()}`,
      words: ({ pinChanged }) => pinChanged,
    });
  });
}
