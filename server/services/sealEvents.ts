import { createHash } from 'node:crypto';
import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { clock } from '../clock';
import { sequelize, transact } from '../db';
import type { Event } from '../models/Event';
import { Seal } from '../models/Seal';
import { hashOf } from './contentHash';
import { mailSeal } from './mailSeal';

/** Whoever began to write an event before this long ago has finished, or was rolled back. */
const SETTLED_AFTER = 10 * 60_000;
/** Any number will do, as long as every process uses the same. */
const ADVISORY_LOCK = 7_071_302;
const BATCH = 5000;

export interface SealedRange {
  firstSeq: number;
  lastSeq: number;
  count: number;
  eventsHash: string;
  previousHash: string | null;
  sealedAt: Date;
}

/** The hash of a seal: the next one carries it, and so does the mail to safety. */
export function sealHash(seal: SealedRange): string {
  return hashOf({ ...seal, sealedAt: seal.sealedAt.toISOString() });
}

/** SHA-256 over the hashes of events, one a line, in the order of seq. */
export function eventsHasher() {
  const digest = createHash('sha256');
  return {
    add: (hash: string) => digest.update(`${hash}\n`),
    hex: () => digest.digest('hex'),
  };
}

/** The last event that can be sealed: everything up to it is older than ten minutes. */
async function lastSettled(after: number, transaction: Transaction): Promise<number | null> {
  const limit = new Date(clock.now().getTime() - SETTLED_AFTER);
  const [row] = await sequelize.query<{ last: string | null }>(
    `SELECT max(seq) AS last FROM events
      WHERE seq > $after
        AND seq < coalesce((SELECT min(seq) FROM events WHERE seq > $after AND at > $limit),
                           9223372036854775807)`,
    { bind: { after, limit }, type: QueryTypes.SELECT, transaction },
  );
  return row?.last === null || row?.last === undefined ? null : Number(row.last);
}

async function hashRange(after: number, last: number, transaction: Transaction) {
  const hasher = eventsHasher();
  let count = 0;
  let firstSeq = 0;
  let from = after;
  while (from < last) {
    const rows = await sequelize.query<Pick<Event, 'seq' | 'hash'>>(
      `SELECT seq, hash FROM events WHERE seq > $from AND seq <= $last ORDER BY seq LIMIT ${BATCH}`,
      { bind: { from, last }, type: QueryTypes.SELECT, transaction },
    );
    if (rows.length === 0) break;
    if (count === 0) firstSeq = Number(rows[0]?.seq);
    for (const { hash } of rows) hasher.add(hash);
    count += rows.length;
    from = Number(rows.at(-1)?.seq);
  }
  return { firstSeq, count, eventsHash: hasher.hex() };
}

/**
 * Puts one seal over every event that has none and is older than ten minutes,
 * and mails its hash to safety: who keeps that mail can show that nothing
 * before it was taken away. Answers `null` when there is nothing to seal.
 */
export function sealEvents(): Promise<Seal | null> {
  return transact(async (transaction) => {
    await sequelize.query(`SELECT pg_advisory_xact_lock(${ADVISORY_LOCK})`, { transaction });
    const before = await Seal.findOne({ order: [['id', 'DESC']], transaction });
    const after = Number(before?.lastSeq ?? 0);
    const lastSeq = await lastSettled(after, transaction);
    if (lastSeq === null) return null;
    const range = {
      ...(await hashRange(after, lastSeq, transaction)),
      lastSeq,
      previousHash: before?.hash ?? null,
      sealedAt: clock.now(),
    };
    const seal = await Seal.create(
      {
        ...range,
        firstSeq: String(range.firstSeq),
        lastSeq: String(lastSeq),
        hash: sealHash(range),
      },
      { transaction },
    );
    await mailSeal(transaction, seal);
    return seal;
  });
}
