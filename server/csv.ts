import { CsvError, parse } from 'csv-parse/sync';
import { stringify } from 'csv-stringify/sync';
import type { CsvFault, CsvLine } from '@/shared/registerCsv';

/** A spreadsheet of another country, or a copy from a table, parts its cells by something else. */
function delimiterOf(text: string): string {
  const heading = /^.*$/m.exec(text)?.[0] ?? '';
  return [',', ';', '\t'].find((delimiter) => heading.includes(delimiter)) ?? ',';
}

/** Cuts RFC 4180 text into cells. A quote that is never closed is the one thing that stops the reading. */
export function readCsv(csv: string): { lines: CsvLine[]; faults: CsvFault[] } {
  const text = csv.replace(/^\uFEFF/, '').replace(/\r\n?/g, '\n');
  let lastLine = 0;
  try {
    const records: string[][] = parse(text, {
      delimiter: delimiterOf(text),
      skip_empty_lines: true,
      relax_column_count: true,
      // Inches are written with the quote mark: `36"` is no fault.
      relax_quotes: true,
      // The line on which the record begins goes before its cells.
      on_record: (cells: string[], { lines: end }) => {
        lastLine = end;
        return [String(end - cells.join('').split('\n').length + 1), ...cells];
      },
    });
    const lines = records.map(([line, ...cells]) => ({ line: Number(line), cells }));
    return { lines, faults: [] };
  } catch (fault) {
    if (!(fault instanceof CsvError)) throw fault;
    return {
      lines: [],
      faults: [{ line: lastLine + 1, column: null, code: 'unreadable', value: '' }],
    };
  }
}

/** RFC 4180 text with the mark that spreadsheets want, and no cell that they would run as a formula. */
export function writeCsv(columns: readonly string[], rows: readonly (readonly string[])[]): string {
  return stringify([columns, ...rows] as string[][], {
    bom: true,
    record_delimiter: 'windows',
    escape_formulas: true,
  });
}
