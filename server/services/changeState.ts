import type { Transaction } from 'sequelize';
import type { WorksheetState } from '@/shared/record';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import type { Event } from '../models/Event';
import type { Worksheet } from '../models/Worksheet';
import { allows } from '../policies/worksheet';
import type { Act } from '../policies/worksheet';
import { wrongState } from '../problem';
import { lockWorksheet } from './findWorksheet';
import { recordEvent } from './recordEvent';

interface Change {
  worksheet: Worksheet;
  to: WorksheetState;
  type: string;
  actorId: string | null;
  enteredById?: string | null;
  reason?: string;
  payload?: Record<string, unknown>;
}

/** Moves a worksheet whose row the caller holds, and writes the event of it. */
export async function changeState(
  transaction: Transaction,
  { worksheet, to, type, actorId, enteredById, reason, payload }: Change,
): Promise<Event> {
  const now = clock.now();
  const from = worksheet.state;
  worksheet.set({
    state: to,
    updatedAt: now,
    reason: reason ?? null,
    reasonById: reason === undefined ? null : actorId,
    reasonAt: reason === undefined ? null : now,
  });
  await worksheet.save({ transaction });
  return recordEvent(transaction, {
    subjectType: 'worksheet',
    subjectId: worksheet.id,
    revision: worksheet.revision,
    type,
    actorId,
    enteredById: enteredById ?? null,
    payload: { from, state: to, ...(reason === undefined ? {} : { reason }), ...payload },
  });
}

/** Runs one act on a worksheet in one transaction, if its state allows it. */
export function actOn<T>(
  worksheetId: string,
  act: Act,
  work: (worksheet: Worksheet, transaction: Transaction) => Promise<T>,
): Promise<T> {
  return transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    if (!allows(worksheet.state, act)) throw wrongState(worksheet.state);
    return work(worksheet, transaction);
  });
}

interface ReasonedAct {
  worksheetId: string;
  reason: string;
}
export type ReasonedService = (actor: CurrentUser, act: ReasonedAct) => Promise<Worksheet>;
