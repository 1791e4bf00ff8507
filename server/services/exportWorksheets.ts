import { Readable } from 'node:stream';
import type { Writable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { stringify } from 'csv-stringify';
import { Op } from 'sequelize';
import type { WhereOptions } from 'sequelize';
import { ZipFile } from 'yazl';
import type { CurrentUser } from '../currentUser';
import { Worksheet } from '../models/Worksheet';
import { renderWorksheetPdf } from '../pdf/renderWorksheetPdf';
import type { PdfLanguage } from '../pdf/input';
import { presentWorksheetRow } from '../presenters/worksheetRow';
import { conflict } from '../problem';
import { expireWorksheets } from './expireWorksheets';
import { worksheetConditions } from './listWorksheets';
import type { WorksheetFilters } from './listWorksheets';
import { pdfInput } from './pdfInput';
import { loadRowParts } from './readRows';

const BATCH = 500;
export const MAX_PDFS = 500;

/** All worksheets of a filter, newest first, a batch at a time: the memory of one batch is enough. */
async function* batches(
  actor: CurrentUser,
  filters: WorksheetFilters,
): AsyncGenerator<Worksheet[]> {
  await expireWorksheets();
  const conditions = await worksheetConditions(actor, filters);
  let position: WhereOptions<Worksheet> = {};
  for (;;) {
    const rows: Worksheet[] = await Worksheet.findAll({
      where: { [Op.and]: [conditions, position] } as WhereOptions<Worksheet>,
      order: [
        ['createdAt', 'DESC'],
        ['id', 'DESC'],
      ],
      limit: BATCH,
    });
    if (rows.length > 0) yield rows;
    const last = rows.at(-1);
    if (last === undefined || rows.length < BATCH) return;
    const { createdAt, id } = last;
    position = {
      [Op.or]: [{ createdAt: { [Op.lt]: createdAt } }, { createdAt, id: { [Op.lt]: id } }],
    };
  }
}

/** A client that goes away before the end has had enough: no fault of the server. */
async function untilClosed(stream: Promise<void>): Promise<void> {
  try {
    await stream;
  } catch (fault) {
    const isGone =
      fault instanceof Error && 'code' in fault && fault.code === 'ERR_STREAM_PREMATURE_CLOSE';
    if (!isGone) throw fault;
  }
}

const COLUMNS = [
  'number',
  'state',
  'proved',
  'revision',
  'site',
  'area',
  'equipment',
  'task',
  'mode',
  'system',
  'circuitVolts',
  'verdict',
  'stops',
  'lead',
  'crew',
  'reason',
  'startsAt',
  'endsAt',
  'createdAt',
  'updatedAt',
];

async function* csvRows(actor: CurrentUser, filters: WorksheetFilters): AsyncGenerator<string[]> {
  for await (const worksheets of batches(actor, filters)) {
    for (const parts of await loadRowParts(worksheets)) {
      const row = presentWorksheetRow(parts);
      yield [
        row.number,
        row.state,
        row.proved,
        row.revision,
        row.siteName ?? '',
        row.area,
        row.equipment,
        row.task ?? '',
        row.mode ?? '',
        row.system ?? '',
        row.circuitVolts ?? '',
        row.verdict,
        row.counts.stop,
        row.leadName,
        row.crew.map(({ name }) => name).join('; '),
        row.reason ?? '',
        row.startsAt ?? '',
        row.endsAt ?? '',
        row.createdAt,
        row.updatedAt,
      ].map(String);
    }
  }
}

/** Writes the worksheets of a filter as RFC 4180 text, with the mark that spreadsheets want. */
export async function exportCsv(
  actor: CurrentUser,
  filters: WorksheetFilters,
  out: Writable,
): Promise<void> {
  const text = stringify({
    header: true,
    columns: COLUMNS,
    bom: true,
    record_delimiter: 'windows',
    // A spreadsheet takes a cell that begins with =, +, -, @, tab or CR for a formula.
    escape_formulas: true,
  });
  await untilClosed(pipeline(Readable.from(csvRows(actor, filters)), text, out));
}

/** The worksheets of a ZIP; 409 when the filter finds too many. */
export async function worksheetsToPrint(
  actor: CurrentUser,
  filters: WorksheetFilters,
): Promise<Worksheet[]> {
  const found: Worksheet[] = [];
  for await (const worksheets of batches(actor, filters)) {
    found.push(...worksheets);
    if (found.length > MAX_PDFS) {
      throw conflict('A ZIP holds at most 500 PDFs. Filter for fewer worksheets.');
    }
  }
  return found;
}

/** Writes one PDF a worksheet into a ZIP, one after the other; names are made of numbers only. */
export async function exportZip(
  worksheets: readonly Worksheet[],
  language: PdfLanguage,
  out: Writable,
): Promise<void> {
  const zip = new ZipFile();
  const written = pipeline(zip.outputStream as Readable, out);
  // What fails before the stream is awaited must not be an unhandled rejection.
  written.catch(() => undefined);
  for (const worksheet of worksheets) {
    if (out.destroyed) break;
    const bytes = await renderWorksheetPdf(await pdfInput(worksheet, worksheet.revision), language);
    zip.addBuffer(bytes, `${worksheet.number}-r${worksheet.revision}.pdf`, {
      mtime: worksheet.updatedAt,
      // A PDF is compressed already.
      compress: false,
    });
  }
  zip.end();
  await untilClosed(written);
}
