import { Op } from 'sequelize';
import type { Transaction } from 'sequelize';
import type { Seal } from '../models/Seal';
import { User } from '../models/User';
import { queueMail } from './queueMail';

/** Mails the hash of a seal to everyone in safety: it proves later that the trail was not cut off. */
export async function mailSeal(transaction: Transaction, seal: Seal): Promise<void> {
  const people = await User.findAll({
    where: { role: 'safety', retiredAt: { [Op.is]: null } },
    order: [['id', 'ASC']],
    transaction,
  });
  const date = seal.sealedAt.toISOString().slice(0, 10);
  for (const recipient of people) {
    await queueMail(transaction, {
      recipient,
      about: `seal ${seal.hash}`,
      words: (mail) => ({
        subject: mail.seal.subject(date),
        body: mail.seal.body(seal.count, seal.hash),
      }),
    });
  }
}
