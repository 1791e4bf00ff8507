import { Op } from 'sequelize';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { PasswordReset } from '../models/PasswordReset';
import { User } from '../models/User';
import { conflict } from '../problem';
import { queueLinkMail } from './queueMail';
import { recordEvent } from './recordEvent';

/**
 * Mails the invitation again to a person who has not chosen a password yet.
 * Every link of before stops working at once, also where the mail is slow.
 */
export function inviteAgain(actor: CurrentUser, userId: string): Promise<User> {
  return transact(async (transaction) => {
    const lock = transaction.LOCK.UPDATE;
    const user = await User.findByPk(userId, { transaction, lock, rejectOnEmpty: true });
    if (user.passwordHash !== null) {
      throw conflict('This person has chosen a password. They ask for a new one at sign-in.');
    }
    if (user.retiredAt !== null) throw conflict('This person is retired.');
    const now = clock.now();
    await PasswordReset.update(
      { usedAt: now },
      { where: { userId, usedAt: { [Op.is]: null } }, transaction },
    );
    await user.update({ invitedAt: now, updatedAt: now }, { transaction });
    await recordEvent(transaction, {
      subjectType: 'user',
      subjectId: userId,
      type: 'invited-again',
      actorId: actor.id,
    });
    await queueLinkMail(transaction, 'invitation', userId);
    return user;
  });
}
