import { Op, QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { v7 } from 'uuid';
import {
  classCell,
  readPeople,
  readRubberGoods,
  serialKey,
  type CsvFault,
  type CsvLine,
  type CsvPerson,
  type CsvReading,
  type CsvRegister,
  type CsvRubberGoods,
  type ImportAnswer,
} from '@/shared/registerCsv';
import { readCsv } from '../csv';
import type { CurrentUser } from '../currentUser';
import { sequelize, transact } from '../db';
import { RubberGoods } from '../models/RubberGoods';
import { Site } from '../models/Site';
import { User } from '../models/User';
import { todayIn } from '../presenters/user';
import { invalidInput } from '../problem';
import { insertRubberGoods } from './saveRubberGoods';
import { insertUser } from './saveUser';

interface ImportRequest {
  csv: string;
  confirm?: boolean | undefined;
}

interface Kind<T> {
  read(lines: readonly CsvLine[], register: CsvRegister): CsvReading<T>;
  taken(transaction: Transaction): Promise<Set<string>>;
  insert(transaction: Transaction, actor: CurrentUser, value: T): Promise<unknown>;
  cells(value: T, siteName: (id: string) => string): Record<string, string>;
}

/** Sites in use by their name; a name that two of them have names neither. */
async function sitesByName(transaction: Transaction) {
  const rows = await Site.findAll({ where: { retiredAt: { [Op.is]: null } }, transaction });
  const counts = new Map<string, number>();
  for (const { name } of rows) {
    const key = name.trim().toLowerCase();
    counts.set(key, (counts.get(key) ?? 0) + 1);
  }
  const unique = rows.filter(({ name }) => counts.get(name.trim().toLowerCase()) === 1);
  return {
    sites: new Map(
      unique.map(({ id, name, timeZone }) => [
        name.trim().toLowerCase(),
        { id, today: todayIn(timeZone) },
      ]),
    ),
    nameOf: (id: string) => rows.find((row) => row.id === id)?.name ?? '',
  };
}

const people: Kind<CsvPerson> = {
  read: readPeople,
  async taken(transaction) {
    // Of everybody, the retired as well: an address is unique for ever.
    const rows = await User.findAll({ attributes: ['email'], transaction });
    return new Set(rows.map(({ email }) => email.toLowerCase()));
  },
  insert: (transaction, actor, person) => insertUser(transaction, actor, { id: v7(), ...person }),
  cells: ({ name, email, role, siteIds, qualifiedThrough, locale, units }, siteName) => ({
    name,
    email,
    role,
    sites: siteIds.map(siteName).join('; '),
    qualifiedThrough: qualifiedThrough ?? '',
    language: locale,
    units,
  }),
};

const rubberGoods: Kind<CsvRubberGoods> = {
  read: readRubberGoods,
  async taken(transaction) {
    const rows = await RubberGoods.findAll({ attributes: ['siteId', 'serial'], transaction });
    return new Set(rows.map(({ siteId, serial }) => serialKey(siteId, serial)));
  },
  insert: (transaction, actor, item) =>
    insertRubberGoods(transaction, actor, { id: v7(), ...item }),
  cells: ({ siteId, kind, gloveClass, serial, size, issuedOn, tests }, siteName) => ({
    site: siteName(siteId),
    kind,
    class: classCell(gloveClass),
    serial,
    size,
    issuedOn: issuedOn ?? '',
    testedOn: tests[0]?.testedOn ?? '',
    result: 'passed',
    laboratory: tests[0]?.laboratory ?? '',
  }),
};

/** Two imports at once would not see each other's lines; the second waits. */
async function oneAtATime(transaction: Transaction): Promise<void> {
  await sequelize.query(`SELECT pg_advisory_xact_lock(hashtext('register import'))`, {
    type: QueryTypes.SELECT,
    transaction,
  });
}

/** Lines that are not right as a problem document; nothing was imported. */
function faultsOf(faults: readonly CsvFault[]) {
  return invalidInput(
    faults.map(({ line, column, code, value }) => ({
      pointer: `#/csv/${line}${column === null ? '' : `/${column}`}`,
      code,
      message: value === '' ? 'This line is not right.' : `This line is not right: ${value}`,
    })),
  );
}

function importOf<T>(kind: Kind<T>) {
  return (actor: CurrentUser, { csv, confirm = false }: ImportRequest): Promise<ImportAnswer> =>
    transact(async (transaction) => {
      if (confirm) await oneAtATime(transaction);
      const { lines, faults: cut } = readCsv(csv);
      const { sites, nameOf } = await sitesByName(transaction);
      const taken = await kind.taken(transaction);
      const { rows, faults } =
        cut.length > 0 ? { rows: [], faults: cut } : kind.read(lines, { sites, taken });
      const bad = new Set(faults.map(({ line }) => line));
      const right = rows.filter(({ line }) => !bad.has(line));
      if (confirm && faults.length > 0) throw faultsOf(faults);
      if (confirm) {
        for (const { value } of right) await kind.insert(transaction, actor, value);
      }
      return {
        count: right.length,
        rows: right.map(({ line, value }) => ({ line, cells: kind.cells(value, nameOf) })),
        errors: faults,
        created: confirm ? right.length : 0,
      };
    });
}

/**
 * Shows what a file of people would do, or, with `confirm`, adds all of them,
 * each with an event and an invitation, in one transaction: all or nobody.
 */
export const importPeople = importOf(people);

/** The same for rubber goods. */
export const importRubberGoods = importOf(rubberGoods);
