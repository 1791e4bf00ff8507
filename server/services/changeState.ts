import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import type { WorksheetState } from '@/shared/record';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { sequelize, transact } from '../db';
import type { Event } from '../models/Event';
import type { Worksheet } from '../models/Worksheet';
import { allows } from '../policies/worksheet';
import type { Act } from '../policies/worksheet';
import { idTaken, wrongState } from '../problem';
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

interface NamedAct {
  worksheetId: string;
  act: Act;
  /** Chosen by the client, so that a repeat after a lost answer is the same act. */
  id?: string | undefined;
}

/** Writes the client's id of an act down; false when it stands there as this very act. The primary key decides. */
async function isFirst(
  actor: CurrentUser,
  { id, worksheetId, act }: NamedAct,
  transaction: Transaction,
): Promise<boolean> {
  if (id === undefined) return true;
  const inserted = await sequelize.query(
    `INSERT INTO acts (id, worksheet_id, act, actor_id, at)
     VALUES ($id, $worksheetId, $act, $actorId, $at) ON CONFLICT (id) DO NOTHING RETURNING id`,
    {
      bind: { id, worksheetId, act, actorId: actor.id, at: clock.now() },
      type: QueryTypes.SELECT,
      transaction,
    },
  );
  if (inserted.length > 0) return true;
  const same = await sequelize.query(
    `SELECT 1 FROM acts
      WHERE id = $id AND worksheet_id = $worksheetId AND act = $act AND actor_id = $actorId`,
    { bind: { id, worksheetId, act, actorId: actor.id }, type: QueryTypes.SELECT, transaction },
  );
  if (same.length === 0) throw idTaken();
  return false;
}

/** The same, once for each id: the same person's repeat gets the worksheet as it stands, whatever its state. */
export function actOnce(
  actor: CurrentUser,
  named: NamedAct,
  work: (worksheet: Worksheet, transaction: Transaction) => Promise<unknown>,
): Promise<Worksheet> {
  return transact(async (transaction) => {
    const worksheet = await lockWorksheet(named.worksheetId, transaction);
    if (!(await isFirst(actor, named, transaction))) return worksheet;
    if (!allows(worksheet.state, named.act)) throw wrongState(worksheet.state);
    await work(worksheet, transaction);
    return worksheet;
  });
}

interface ReasonedAct {
  worksheetId: string;
  id?: string | undefined;
  reason: string;
}
export type ReasonedService = (actor: CurrentUser, act: ReasonedAct) => Promise<Worksheet>;
