import type { Transaction } from 'sequelize';
import type { CurrentUser } from '../currentUser';
import { Worksheet } from '../models/Worksheet';
import { mayRead } from '../policies/worksheet';
import { notFound } from '../problem';
import { expireIfOver } from './expireWorksheets';

/**
 * A worksheet that this person may see, as it stands now: one whose planned
 * end has passed is expired first, also when the job is late. 404 otherwise,
 * whether it exists or not.
 */
export async function findWorksheet(actor: CurrentUser, worksheetId: string): Promise<Worksheet> {
  const worksheet = await Worksheet.findByPk(worksheetId);
  if (worksheet === null || !mayRead(actor, worksheet)) throw notFound();
  return expireIfOver(worksheet);
}

/** The row of a worksheet, held until the transaction ends: every writer takes it first. */
export function lockWorksheet(worksheetId: string, transaction: Transaction): Promise<Worksheet> {
  return Worksheet.findByPk(worksheetId, {
    transaction,
    lock: transaction.LOCK.UPDATE,
    rejectOnEmpty: true,
  });
}
