import type { Column } from '../ui';
import type { RegisterViewControl } from './useRegisterView';

type Key = string | number;

/** Rows by the column that the address names; a minus before it turns the order round. */
export function inOrder<Row>(
  rows: readonly Row[],
  sort: string,
  keys: Readonly<Record<string, (row: Row) => Key>>,
): Row[] {
  const name = sort.replace(/^-/, '');
  const keyOf = keys[name];
  if (keyOf === undefined) return [...rows];
  const sign = sort.startsWith('-') ? -1 : 1;
  return [...rows].sort((one, other) => {
    const [a, b] = [keyOf(one), keyOf(other)];
    const order =
      typeof a === 'string' && typeof b === 'string'
        ? a.localeCompare(b, undefined, { numeric: true })
        : Number(a) - Number(b);
    return sign * order;
  });
}

/** The head of a column that sorts: pressed again it turns the order round. */
export function sortable(
  key: string,
  sort: string,
  view: RegisterViewControl,
): Pick<Column<never>, 'onSort' | 'sorted'> {
  const on = sort.replace(/^-/, '') === key;
  const down = sort.startsWith('-');
  return {
    onSort: () => view.set({ sort: on && !down ? `-${key}` : key }),
    sorted: on ? (down ? 'descending' : 'ascending') : undefined,
  };
}
