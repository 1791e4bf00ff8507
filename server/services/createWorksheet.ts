import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import type { WorksheetContent } from '@/shared/worksheet';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { sequelize, transact } from '../db';
import { Worksheet } from '../models/Worksheet';
import { idTaken, invalidField, invalidInput, notAllowed } from '../problem';
import { applyRegister } from './applyRegister';
import { recordEvent } from './recordEvent';
import { writeDraft } from './writeDraft';

interface NewWorksheet {
  id?: string | undefined;
  content: WorksheetContent;
  leadId?: string | undefined;
}

/** Gives out the next number of the year: `2026-000123`. */
async function nextNumber(transaction: Transaction): Promise<string> {
  const year = clock.now().getUTCFullYear();
  const [row] = await sequelize.query<{ last: number }>(
    `INSERT INTO worksheet_numbers (year, last) VALUES ($year, 1)
     ON CONFLICT (year) DO UPDATE SET last = worksheet_numbers.last + 1 RETURNING last`,
    { bind: { year }, type: QueryTypes.SELECT, transaction },
  );
  return `${year}-${String(row?.last).padStart(6, '0')}`;
}

/** An active lead or supervisor who shares a site with the one who plans the work for them. */
async function checkLead(actor: CurrentUser, leadId: string): Promise<void> {
  if (leadId === actor.id) return;
  if (actor.role === 'lead') throw notAllowed('A lead creates worksheets of their own.');
  const found = await sequelize.query(
    `SELECT 1 FROM users u JOIN site_members m ON m.user_id = u.id
      WHERE u.id = $leadId AND u.role IN ('lead', 'supervisor') AND u.retired_at IS NULL
        AND m.site_id = ANY($siteIds::uuid[]) LIMIT 1`,
    { bind: { leadId, siteIds: actor.siteIds }, type: QueryTypes.SELECT },
  );
  if (found.length > 0) return;
  throw invalidField('#/leadId', 'not-in-register', 'This is no active lead at a site of yours.');
}

interface Insertion {
  id: string;
  leadId: string;
  content: WorksheetContent;
  actor: CurrentUser;
  /** What the first event says beyond the lead. */
  payload?: Record<string, unknown>;
}

/** Inserts a worksheet with its first revision. The primary key decides whose the id is. */
export function insertWorksheet({
  id,
  leadId,
  content,
  actor,
  payload,
}: Insertion): Promise<Worksheet> {
  return transact(async (transaction) => {
    const now = clock.now();
    const number = await nextNumber(transaction);
    const worksheet = await Worksheet.create(
      {
        id,
        number,
        leadId,
        createdById: actor.id,
        siteId: null,
        startsAt: null,
        endsAt: null,
        mode: null,
        task: null,
        system: null,
        circuitVolts: null,
        reason: null,
        reasonById: null,
        reasonAt: null,
        createdAt: now,
        updatedAt: now,
      },
      { transaction },
    );
    await writeDraft({ worksheet, content, actorId: actor.id }, transaction);
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: id,
      revision: 1,
      type: 'created',
      actorId: actor.id,
      payload: { number, leadId, state: 'draft', ...payload },
    });
    return worksheet;
  });
}

/** Whether the id was refused because it exists. */
export function isIdTaken(fault: unknown): boolean {
  return (
    typeof fault === 'object' &&
    fault !== null &&
    'name' in fault &&
    fault.name === 'SequelizeUniqueConstraintError'
  );
}

/**
 * What an id that exists stands for: the same person's repeat of the same
 * creation, or nothing that they are told about.
 */
export async function ownCreation(actor: CurrentUser, id: string): Promise<Worksheet> {
  const existing = await Worksheet.findByPk(id);
  if (existing?.createdById !== actor.id) throw idTaken();
  return existing;
}

/** Creates a draft; a repeat with the same id by the same person gives the record as it stands. */
export async function createWorksheet(
  actor: CurrentUser,
  { id = v7(), content, leadId = actor.id }: NewWorksheet,
): Promise<{ worksheet: Worksheet; created: boolean }> {
  await checkLead(actor, leadId);
  const answer = await applyRegister({ content, leadId });
  if (answer.errors.length > 0) throw invalidInput(answer.errors);
  try {
    const worksheet = await insertWorksheet({ id, leadId, content: answer.content, actor });
    return { worksheet, created: true };
  } catch (fault) {
    if (!isIdTaken(fault)) throw fault;
    return { worksheet: await ownCreation(actor, id), created: false };
  }
}
