import { literal, Op } from 'sequelize';
import type { Order, WhereOptions } from 'sequelize';
import { z } from 'zod';
import { MODES, SYSTEMS } from '@/hazard/enumerations';
import { STATES } from '@/shared/record';
import { date, id, text } from '@/shared/text';
import type { CurrentUser } from '../currentUser';
import { sequelize } from '../db';
import { Worksheet } from '../models/Worksheet';
import { invalidField } from '../problem';
import { expireWorksheets } from './expireWorksheets';
import { searchWorksheets } from './searchWorksheets';

/** Query parameters may come once or several times; several mean "any of these". */
function several<T extends z.ZodType>(item: T) {
  return z.preprocess(
    (value) => (typeof value === 'string' ? value.split(',').filter((part) => part !== '') : value),
    z.array(item).max(50).optional(),
  );
}

export const SORTS = ['createdAt', 'updatedAt', 'startsAt', 'endsAt', 'number'] as const;
const sorts = SORTS.flatMap((column) => [column, `-${column}` as const]);

const filterFields = {
  q: text(200).optional(),
  state: several(z.enum(STATES)),
  siteId: several(id),
  system: several(z.enum(SYSTEMS)),
  circuitVolts: several(z.coerce.number().nonnegative()),
  mode: several(z.enum(MODES)),
  person: id.optional(),
  rubberGoods: id.optional(),
  finding: several(text(100)),
  from: date.optional(),
  to: date.optional(),
};
export const worksheetFiltersSchema = z.strictObject(filterFields);
export type WorksheetFilters = z.infer<typeof worksheetFiltersSchema>;

/** `GET /api/worksheets`: filters, order and page. A leading minus means from the last to the first. */
export const worksheetListSchema = z.strictObject({
  ...filterFields,
  sort: z.enum(sorts as [string, ...string[]]).optional(),
  cursor: z.string().max(500).optional(),
  limit: z.coerce.number().int().min(1).max(200).optional(),
});
export type WorksheetListQuery = z.infer<typeof worksheetListSchema>;

/** What this person may see, as a condition: the same as `mayRead`. */
function visibleTo({ id: me, role, siteIds }: CurrentUser): WhereOptions<Worksheet>[] {
  if (role === 'safety') return [];
  const own: WhereOptions<Worksheet>[] = [
    { leadId: me },
    { createdById: me },
    { crewIds: { [Op.contains]: [me] } },
    { signedCrewIds: { [Op.contains]: [me] } },
  ];
  if (role === 'supervisor' && siteIds.length > 0) own.push({ siteId: siteIds });
  return [{ [Op.or]: own }];
}

function namedOn(person: string): WhereOptions<Worksheet> {
  return {
    [Op.or]: [
      { leadId: person },
      { createdById: person },
      { crewIds: { [Op.contains]: [person] } },
      { signedCrewIds: { [Op.contains]: [person] } },
    ],
  };
}

/** Whose plan named this pair, in any revision: an inspector asks where it was worn. */
function wornOn(rubberGoods: string) {
  return literal(`"Worksheet"."id" IN (SELECT worksheet_id FROM worksheet_revisions
    WHERE content #>> '{protectiveEquipment,rubberGoodsId}' = ${sequelize.escape(rubberGoods)})`);
}

/** Midnight UTC so many days after a day, and none before 1970: nothing is older. */
const dayAfter = (day: string, days: number) =>
  new Date(Math.max(0, Date.parse(day) + days * 86_400_000));

/**
 * `from` and `to` are whole days, both included, on the calendar of the
 * worksheet's site. Wherever that is, its day lies within a day of the one in
 * UTC: that bound is one that an index can find.
 */
function createdWithin(from: string | undefined, to: string | undefined) {
  const zone = `coalesce((SELECT time_zone FROM sites WHERE sites.id = "Worksheet"."site_id"), 'UTC')`;
  const day = `("Worksheet"."created_at" AT TIME ZONE ${zone})::date`;
  return [
    ...(from === undefined
      ? []
      : [
          { createdAt: { [Op.gte]: dayAfter(from, -1) } },
          literal(`${day} >= ${sequelize.escape(from)}`),
        ]),
    ...(to === undefined
      ? []
      : [
          { createdAt: { [Op.lt]: dayAfter(to, 2) } },
          literal(`${day} <= ${sequelize.escape(to)}`),
        ]),
  ];
}

async function matching(q: string): Promise<unknown> {
  const ids = await searchWorksheets(q);
  return ids === undefined
    ? literal(`"Worksheet"."search" @@ search_query(${sequelize.escape(q)})`)
    : { id: ids };
}

/** All conditions of a list, for the list itself and the exports. */
export async function worksheetConditions(
  actor: CurrentUser,
  filters: WorksheetFilters,
): Promise<WhereOptions<Worksheet>> {
  const { q, state, siteId, system, circuitVolts, mode, person, rubberGoods, finding } = filters;
  const { from, to } = filters;
  const conditions: unknown[] = [...visibleTo(actor), ...createdWithin(from, to)];
  if (q !== undefined && q.trim() !== '') {
    conditions.push(await matching(q));
  }
  const equal = { state, siteId, system, circuitVolts, mode };
  for (const [column, values] of Object.entries(equal)) {
    if (values !== undefined && values.length > 0) conditions.push({ [column]: values });
  }
  if (person !== undefined) conditions.push(namedOn(person));
  if (rubberGoods !== undefined) conditions.push(wornOn(rubberGoods));
  if (finding !== undefined && finding.length > 0) {
    conditions.push({
      [Op.or]: [
        { findingCodes: { [Op.overlap]: finding } },
        { metCodes: { [Op.overlap]: finding } },
      ],
    });
  }
  return { [Op.and]: conditions } as WhereOptions<Worksheet>;
}

interface Sorting {
  column: (typeof SORTS)[number];
  descending: boolean;
}

function sortingOf(sort = '-createdAt'): Sorting {
  const descending = sort.startsWith('-');
  return { column: sort.replace(/^-/, '') as Sorting['column'], descending };
}

const cursorSchema = z.tuple([z.string(), z.string().nullable(), z.uuid()]);

function cursorOf(row: Worksheet, sort: string, { column }: Sorting): string {
  const value = row[column];
  const key = value instanceof Date ? value.toISOString() : value;
  return Buffer.from(JSON.stringify([sort, key, row.id])).toString('base64url');
}

function readCursor(cursor: string, sort: string): [string | null, string] {
  try {
    const decoded: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString());
    const [ofSort, key, after] = cursorSchema.parse(decoded);
    const isKey = key === null || sort.endsWith('number') || !Number.isNaN(Date.parse(key));
    if (ofSort === sort && isKey) return [key, after];
  } catch {
    // Answered below, with every other cursor that is not one of ours.
  }
  throw invalidField('#/cursor', 'cursor', 'This is no cursor of this list.');
}

/** Rows after the cursor, in the order of the list. Empty keys come last in either direction. */
function after([key, lastId]: [string | null, string], { column, descending }: Sorting) {
  const beyond = descending ? Op.lt : Op.gt;
  if (key === null) return { [column]: null, id: { [beyond]: lastId } };
  return {
    [Op.or]: [
      { [column]: { [beyond]: key } },
      { [column]: key, id: { [beyond]: lastId } },
      { [column]: null },
    ],
  };
}

/** One page of the worksheets that this person may see, with the cursor of the next. */
export async function listWorksheets(
  actor: CurrentUser,
  { sort = '-createdAt', cursor, limit = 50, ...rest }: WorksheetListQuery,
): Promise<{ rows: Worksheet[]; nextCursor: string | null }> {
  await expireWorksheets();
  const sorting = sortingOf(sort);
  const position = cursor === undefined ? null : readCursor(cursor, sort);
  const where = {
    [Op.and]: [
      await worksheetConditions(actor, rest),
      ...(position === null ? [] : [after(position, sorting)]),
    ],
  } as WhereOptions<Worksheet>;
  const direction = sorting.descending ? 'DESC' : 'ASC';
  const isNullable = sorting.column === 'startsAt' || sorting.column === 'endsAt';
  const order: Order = [
    [sorting.column, isNullable ? `${direction} NULLS LAST` : direction],
    ['id', direction],
  ];
  const rows = await Worksheet.findAll({ where, order, limit: limit + 1 });
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  const nextCursor =
    rows.length > limit && last !== undefined ? cursorOf(last, sort, sorting) : null;
  return { rows: page, nextCursor };
}
