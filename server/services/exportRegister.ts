import {
  classCell,
  EXPORT_ONLY_COLUMNS,
  PEOPLE_COLUMNS,
  RUBBER_GOODS_COLUMNS,
} from '@/shared/registerCsv';
import { writeCsv } from '../csv';
import { RubberGoods } from '../models/RubberGoods';
import { Site } from '../models/Site';
import { User } from '../models/User';
import { presentRubberGoods } from '../presenters/rubberGoods';
import { placesOf } from './listPeople';
import { partsOf } from './listRubberGoods';

async function siteNames(): Promise<Map<string, string>> {
  const sites = await Site.findAll({ attributes: ['id', 'name'] });
  return new Map(sites.map(({ id, name }) => [id, name]));
}

const yesNo = (value: boolean) => (value ? 'yes' : 'no');
const [ACCOUNT, DUE_ON, IN_TEST, RETIRED, RETIRED_BECAUSE] = EXPORT_ONLY_COLUMNS as [
  string,
  string,
  string,
  string,
  string,
];

function accountOf({ passwordHash, invitedAt }: User): string {
  if (passwordHash !== null) return 'in use';
  return invitedAt === null ? 'none' : 'invited';
}

/** Everybody in the register, by name; an import reads the same columns. */
export async function exportPeople(): Promise<string> {
  const users = await User.findAll({ order: ['name', 'id'] });
  const places = await placesOf(users.map(({ id }) => id));
  const names = await siteNames();
  const rows = users.map((user) => [
    user.name,
    user.email,
    user.role,
    (places.get(user.id)?.siteIds ?? []).map((id) => names.get(id) ?? '').join('; '),
    user.qualifiedThrough ?? '',
    user.locale,
    user.units,
    accountOf(user),
    yesNo(user.retiredAt !== null),
  ]);
  return writeCsv([...PEOPLE_COLUMNS, ACCOUNT, RETIRED], rows);
}

/** All rubber goods, by serial number, each with its latest test. */
export async function exportRubberGoods(): Promise<string> {
  const goods = await RubberGoods.findAll({ order: ['serial', 'id'] });
  const names = await siteNames();
  const rows = (await partsOf(goods)).map(presentRubberGoods).map((item) => {
    const latest = [...item.tests].sort((one, other) =>
      other.testedOn.localeCompare(one.testedOn),
    )[0];
    return [
      names.get(item.siteId) ?? '',
      item.kind,
      classCell(item.gloveClass),
      item.serial,
      item.size,
      item.issuedOn ?? '',
      latest?.testedOn ?? '',
      latest === undefined ? '' : latest.passed ? 'passed' : 'failed',
      latest?.laboratory ?? '',
      item.dueOn,
      yesNo(item.inTest),
      yesNo(item.retired),
      item.retiredBecause ?? '',
    ];
  });
  const columns = [...RUBBER_GOODS_COLUMNS, DUE_ON, IN_TEST, RETIRED, RETIRED_BECAUSE];
  return writeCsv(columns, rows);
}
