import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { clock } from '../clock';
import { sequelize } from '../db';
import { Event } from '../models/Event';
import type { SubjectType } from '../models/Event';
import { hashOf } from './contentHash';

interface NewEvent {
  subjectType: SubjectType;
  subjectId: string;
  type: string;
  revision?: number | null;
  /** Whose act it is; null for the clock. */
  actorId: string | null;
  /** On whose session it was entered, where that is someone else. */
  enteredById?: string | null;
  /** JSON only. Hashes and ids, never text of a person's beyond a stated reason. */
  payload?: Record<string, unknown>;
}

export interface HashedEvent {
  seq: number;
  subjectType: string;
  subjectId: string;
  revision: number | null;
  type: string;
  actorId: string | null;
  enteredById: string | null;
  at: Date;
  payload: Record<string, unknown>;
  previousHash: string | null;
}

/** The hash of an event: what the chain of its subject is made of. */
export function eventHash(event: HashedEvent): string {
  const { seq, subjectType, subjectId, revision, type, actorId, enteredById } = event;
  const { payload, previousHash } = event;
  const at = event.at.toISOString();
  return hashOf({
    seq,
    subjectType,
    subjectId,
    revision,
    type,
    actorId,
    enteredById,
    at,
    payload,
    previousHash,
  });
}

/**
 * Appends to the chain of a subject. The caller holds a lock on the subject's
 * row, or has just made it, so that two writers never follow the same event.
 */
export async function recordEvent(transaction: Transaction, event: NewEvent): Promise<Event> {
  const { subjectType, subjectId, type, actorId } = event;
  const previous = await Event.findOne({
    attributes: ['hash'],
    where: { subjectId },
    order: [['seq', 'DESC']],
    transaction,
  });
  const [next] = await sequelize.query<{ seq: string }>(`SELECT nextval('events_seq_seq') AS seq`, {
    type: QueryTypes.SELECT,
    transaction,
  });
  const row = {
    subjectType,
    subjectId,
    revision: event.revision ?? null,
    type,
    actorId,
    enteredById: event.enteredById ?? null,
    at: clock.now(),
    // As the database will give it back: no undefined, no Date.
    payload: JSON.parse(JSON.stringify(event.payload ?? {})) as Record<string, unknown>,
    previousHash: previous?.hash ?? null,
  };
  const seq = Number(next?.seq);
  const hash = eventHash({ seq, ...row });
  return Event.create({ seq: String(seq), ...row, hash }, { transaction });
}
