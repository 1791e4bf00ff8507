import { Op } from 'sequelize';
import type { WhereOptions } from 'sequelize';
import { z } from 'zod';
import { invalidField } from './problem';

/** The page of a list: newest first, `createdAt`, then `id`. */
export const pageSchema = z.strictObject({
  cursor: z.string().max(500).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});
export type Page = z.infer<typeof pageSchema>;

interface Keyed {
  id: string;
  createdAt: Date;
}

const cursorSchema = z.tuple([z.iso.datetime(), z.uuid()]);

/** Rows beyond the cursor, as a condition; none without one. */
export function beyond(cursor: string | undefined): WhereOptions<Keyed> {
  if (cursor === undefined) return {};
  const [createdAt, id] = readCursor(cursor);
  return {
    [Op.or]: [
      { createdAt: { [Op.lt]: new Date(createdAt) } },
      { createdAt: new Date(createdAt), id: { [Op.lt]: id } },
    ],
  };
}

function readCursor(cursor: string): [string, string] {
  try {
    return cursorSchema.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8')));
  } catch {
    throw invalidField('#/cursor', 'cursor', 'This is no cursor of this list.');
  }
}

export const newestFirst: [string, string][] = [
  ['createdAt', 'DESC'],
  ['id', 'DESC'],
];

/** Cuts `limit + 1` rows to a page and says where the next begins. */
export function cutPage<T extends Keyed>(
  rows: T[],
  limit: number,
): { rows: T[]; nextCursor: string | null } {
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  const nextCursor =
    rows.length > limit && last !== undefined
      ? Buffer.from(JSON.stringify([last.createdAt.toISOString(), last.id])).toString('base64url')
      : null;
  return { rows: page, nextCursor };
}
