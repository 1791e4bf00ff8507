import type { CsvFault, CsvLine } from '@/shared/registerCsv';

/** Two sites of which one is a day ahead, as past the date line. */
export const CSV_SITES = new Map([
  ['north yard', { id: 'north', today: '2026-06-01' }],
  ['south yard', { id: 'south', today: '2026-06-02' }],
]);

/** The lines of a file: the heading, and a line for each row with its cells by column. */
export function csvLines(
  columns: readonly string[],
  rows: readonly Record<string, string>[],
): CsvLine[] {
  return [
    { line: 1, cells: columns },
    ...rows.map((row, n) => ({ line: n + 2, cells: columns.map((column) => row[column] ?? '') })),
  ];
}

/** Where each fault stands and what it is, without the value. */
export const faultPlaces = (faults: readonly CsvFault[]) =>
  faults.map(({ line, column, code }) => [line, column, code]);
