import { QueryTypes } from 'sequelize';
import { sequelize } from '../db';
import { Event } from '../models/Event';
import { Seal } from '../models/Seal';
import { eventHash } from './recordEvent';
import { eventsHasher, sealHash } from './sealEvents';
import { verifyWorksheets } from './verifyWorksheets';

/** One thing that is not as it was written. */
export interface Fault {
  table: string;
  id: string;
  what: string;
}

export interface Verification {
  faults: Fault[];
  counts: Record<string, number>;
}

const BATCH = 2000;

/** An event with the hash of the one before it in the chain of its subject, as the database has it. */
type Link = Event & { followedHash: string | null };

/**
 * Read in batches, each with what it follows: the record grows for years, and
 * a head of every chain kept in memory would grow with it.
 */
async function* eventsInOrder(): AsyncGenerator<Link> {
  let from = '0';
  for (;;) {
    const rows = await sequelize.query(
      `SELECT e.*, (SELECT hash FROM events before
                     WHERE before.subject_id = e.subject_id AND before.seq < e.seq
                     ORDER BY before.seq DESC LIMIT 1) AS "followedHash"
         FROM events e WHERE e.seq > $from ORDER BY e.seq LIMIT ${BATCH}`,
      { bind: { from }, type: QueryTypes.SELECT, model: Event, mapToModel: true },
    );
    for (const row of rows) {
      const followedHash = row.get('followedHash') as string | null;
      yield Object.assign(row, { followedHash });
    }
    const last = rows.at(-1);
    if (last === undefined || rows.length < BATCH) return;
    from = last.seq;
  }
}

function recomputed(event: Event): string {
  const { subjectType, subjectId, revision, type, actorId, enteredById } = event;
  const { at, payload, previousHash } = event;
  const seq = Number(event.seq);
  return eventHash({
    ...{ seq, subjectType, subjectId, revision, type },
    ...{ actorId, enteredById, at, payload, previousHash },
  });
}

interface SealWalk {
  seals: Seal[];
  position: number;
  hasher: ReturnType<typeof eventsHasher>;
  count: number;
  firstSeq: number | null;
}

function newWalk(seals: Seal[], position: number): SealWalk {
  return { seals, position, hasher: eventsHasher(), count: 0, firstSeq: null };
}

/** Compares a seal with the events that were met in its range. */
function judgeSeal(walk: SealWalk, faults: Fault[]): void {
  const seal = walk.seals[walk.position];
  if (seal === undefined) return;
  const fault = (what: string) => faults.push({ table: 'seals', id: seal.id, what });
  const previousHash = walk.seals[walk.position - 1]?.hash ?? null;
  const { sealedAt, eventsHash, count } = seal;
  const range = { count, eventsHash, sealedAt, previousHash: seal.previousHash };
  const firstSeq = Number(seal.firstSeq);
  const lastSeq = Number(seal.lastSeq);
  if (sealHash({ ...range, firstSeq, lastSeq }) !== seal.hash) fault('the seal was changed');
  if (seal.previousHash !== previousHash) fault('the seal before it is missing or was changed');
  if (walk.count !== count) fault(`it covers ${count} events, ${walk.count} are there`);
  if (walk.firstSeq !== firstSeq) fault('its first event is not the one that was sealed');
  if (walk.hasher.hex() !== eventsHash) fault('an event under it is missing, new or changed');
}

/** Puts an event under its seal; seals that end before it are judged. */
function passSeals(walk: SealWalk, event: Event, faults: Fault[]): SealWalk {
  let current = walk;
  const seq = Number(event.seq);
  while (current.position < current.seals.length) {
    const seal = current.seals[current.position];
    if (seal === undefined || seq <= Number(seal.lastSeq)) break;
    judgeSeal(current, faults);
    current = newWalk(current.seals, current.position + 1);
  }
  current.hasher.add(event.hash);
  current.count += 1;
  current.firstSeq ??= seq;
  return current;
}

/** Answers how many events there are. */
async function walkEvents(seals: Seal[], faults: Fault[]): Promise<number> {
  let walk = newWalk(seals, 0);
  let events = 0;
  for await (const event of eventsInOrder()) {
    events += 1;
    const fault = (what: string) => faults.push({ table: 'events', id: event.seq, what });
    if (recomputed(event) !== event.hash) fault('its content does not fit its hash');
    if (event.followedHash !== event.previousHash) {
      fault('it does not follow the event before it: one is missing, new or changed');
    }
    walk = passSeals(walk, event, faults);
  }
  for (let position = walk.position; position < seals.length; position += 1) {
    judgeSeal(walk, faults);
    walk = newWalk(seals, position + 1);
  }
  return events;
}

/**
 * Walks every chain, seal, content hash and signed row, and names each thing
 * that is not as it was written. With the hash of a seal (from the mail to
 * safety) it also asks that this seal is still there.
 */
export async function verifyRecord(sealedHash?: string): Promise<Verification> {
  const faults: Fault[] = [];
  const seals = await Seal.findAll({ order: [['id', 'ASC']] });
  if (sealedHash !== undefined && !seals.some(({ hash }) => hash === sealedHash)) {
    faults.push({
      table: 'seals',
      id: sealedHash,
      what: 'there is no such seal: the trail was cut off, or the hash is not one of its seals',
    });
  }
  const events = await walkEvents(seals, faults);
  const counts = await verifyWorksheets(faults);
  return { faults, counts: { events, seals: seals.length, ...counts } };
}
