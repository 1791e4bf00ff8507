import type { Content, TableCell } from 'pdfmake/interfaces';
import type { Distance } from '@/hazard/types';
import { amperes, distancePair, milliamperes, volts } from '@/shared/format';
import { PRINT_UNITS, type PdfContext } from './context';
import { fieldTable } from './fieldTable';
import { bold, cite, headCell, rows, strong, subhead } from './style';
import { sources as cited } from './summary';
import { text } from './text';

function boundaryRow(name: string, value: string, note: string, source: string): TableCell[] {
  return [strong(name), bold(value), text(note), cite(source)];
}

/** Section 6: every boundary with both figures, its source, and how that was checked. */
export function boundaries(context: PdfContext): Content[] {
  const { m, worksheet, locale, source } = context;
  const { boundaries: found, arcFlash: arc, barricade, touch, expected } = worksheet.assessment;
  const words = m.pdf.distances;
  const names = m.drawing;
  const content: Content[] = [];
  const written = (value: Distance | null) =>
    value === null ? words.notSpecified : distancePair(value, PRINT_UNITS);
  if (!found) {
    content.push(strong(`${names.zones.distancesNotKnown}.`));
  } else if (!found.inTable) {
    content.push(strong(`${names.zones.outsideTable}.`), cite(source(found.citation)));
  } else {
    const from = source(found.citation);
    const note = (applies: boolean) => (applies ? words.applies : words.limitedOther);
    const restricted =
      found.restricted === 'avoid contact' ? names.zones.avoidContact : written(found.restricted);
    const arcFigure = arc.arcFlashBoundary
      ? written(arc.arcFlashBoundary)
      : arc.method === 'not likely'
        ? words.none
        : words.study;
    const body: TableCell[][] = [
      [headCell(words.boundary), headCell(words.figure), headCell(''), headCell(words.source)],
      boundaryRow(names.restrictedFull, restricted, '', from),
      boundaryRow(names.limitedFixedFull, written(found.limitedFixed), note(!found.movable), from),
      boundaryRow(
        names.limitedMovableFull,
        written(found.limitedMovable),
        note(found.movable),
        from,
      ),
      boundaryRow(names.arcFlashFull, arcFigure, '', cited(arc.citations, context)),
      ...(barricade
        ? [boundaryRow(names.barricadeFull, written(barricade), '', source(barricade.citation))]
        : []),
    ];
    content.push({
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        widths: [130, 110, 80, '*'],
        body,
        dontBreakRows: true,
      },
      layout: rows,
    });
    const because: Readonly<Record<string, string>> = m.common.boundaries.because;
    const tableRows: Readonly<Record<string, string>> = m.common.boundaries.rows;
    content.push(
      ...fieldTable([
        { label: words.volts, value: `${volts(locale, found.volts)} ${m.common.boundaries.volts}` },
        { label: words.row, value: tableRows[found.row] ?? found.row },
        { label: words.because, value: because[found.because] ?? found.because },
      ]),
    );
  }
  if (expected.loadAmperes !== null) {
    content.push(
      ...fieldTable([{ label: words.loadAmperes, value: amperes(locale, expected.loadAmperes) }]),
    );
  }
  if (touch) {
    const mA = (value: number) => milliamperes(locale, value);
    content.push(
      subhead(words.shock),
      text(
        words.shockFigures(volts(locale, touch.volts), mA(touch.p5), mA(touch.p50), mA(touch.p95)),
      ),
      cite(source(touch.citation), { margin: [0, 2, 0, 0] }),
    );
  }
  return content;
}
