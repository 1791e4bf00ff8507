import { CONDUCTORS } from '@/hazard';
import type { Messages } from '@/shared/messages';
import type { Proof, WorksheetContent } from '@/shared/worksheet';

type Reading = NonNullable<Proof['readings']>[number];
type Said = Messages['proof']['proved'];

export interface ProvedTable {
  columns: string[];
  rows: { point: string; volts: (number | null)[] }[];
}

/** The column of a reading: its pair, or its source and the other end. */
function columnOf(reading: Reading, content: WorksheetContent, said: Said): string {
  const { sourceId, from, to, current } = reading;
  if (sourceId === undefined) {
    const ends = [from ?? '', to ?? ''].sort(
      (one, other) =>
        CONDUCTORS.findIndex((each) => each === one) -
        CONDUCTORS.findIndex((each) => each === other),
    );
    return said.pair(ends[0] ?? '', ends[1] ?? '');
  }
  const index = (content.sources ?? []).findIndex(({ id }) => id === sourceId);
  const place = `3.${index + 1}`;
  return current === 'dc' ? said.sourceDc(place) : said.sourceTo(place, to ?? '');
}

/** Of several readings of the same thing the one that counts, as the rules choose it. */
function governing(readings: readonly Reading[]): number | null {
  const read = readings.filter(({ volts }) => volts !== undefined);
  const last = read.at(-1);
  if (last === undefined) return null;
  if (last.lowImpedance === true) return last.volts ?? null;
  return read.reduce(
    (most, { volts = 0 }) => (Math.abs(volts) > Math.abs(most) ? volts : most),
    last.volts ?? 0,
  );
}

/** A recorded proof as one table: a row a point of work, a column a pair. */
export function provedTable(proof: Proof, content: WorksheetContent, said: Said): ProvedTable {
  const readings = proof.readings ?? [];
  const cells = new Map<string, Map<string, Reading[]>>();
  const columns = new Set<string>();
  for (const reading of readings) {
    const point = reading.point ?? '';
    const column = columnOf(reading, content, said);
    columns.add(column);
    const row = cells.get(point) ?? new Map<string, Reading[]>();
    row.set(column, [...(row.get(column) ?? []), reading]);
    cells.set(point, row);
  }
  const shown = [...columns];
  return {
    columns: shown,
    rows: [...cells].map(([point, row]) => ({
      point,
      volts: shown.map((column) => governing(row.get(column) ?? [])),
    })),
  };
}
