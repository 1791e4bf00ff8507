import type { Finding } from '@/hazard/types';
import type { Content, TableCell } from 'pdfmake/interfaces';
import { enumWord, findingWords } from '@/shared/messages';
import { placeOf } from '@/shared/sections';
import { PRINT_UNITS, type PdfContext } from './context';
import {
  bold,
  cite,
  COLORS,
  label,
  medium,
  PAGE,
  rows,
  sectionHead,
  strong,
  subhead,
} from './style';
import { text } from './text';

const COLOR_OF = { stop: COLORS.red, open: COLORS.ink, caution: COLORS.ink } as const;

/** Findings in words with their sources, in the order of the rules. */
export function findingList(findings: readonly Finding[], context: PdfContext): Content[] {
  if (findings.length === 0) return [];
  const { locale, m, source } = context;
  const { shown, left } = firstOfEachKind(findings);
  const body = shown.map((finding): TableCell[] => {
    const words = findingWords(locale, finding, PRINT_UNITS);
    const severity = enumWord(locale, 'severity', finding.severity);
    return [
      bold(severity, { color: COLOR_OF[finding.severity] }),
      {
        stack: [strong(words.title), text(words.text), cite(source(finding.citation))],
      },
      label(m.pdf.findings.section(placeOf(finding)), { alignment: 'right' }),
    ];
  });
  return [
    {
      table: { widths: [62, '*', 64], body, dontBreakRows: true },
      layout: rows,
      margin: [0, 4, 0, 0],
    },
    ...left.map(({ finding, count }): Content => {
      const { title } = findingWords(locale, finding, PRINT_UNITS);
      return strong(m.pdf.findings.alike(title, count), { margin: [0, 3, 0, 0] });
    }),
  ];
}

/** Of one kind so many are written out; a draft can have hundreds, one for each way and point. */
const WRITTEN_OUT = 25;

function firstOfEachKind(findings: readonly Finding[]): {
  shown: Finding[];
  left: { finding: Finding; count: number }[];
} {
  const counts = new Map<string, { finding: Finding; count: number }>();
  const shown = findings.filter((finding) => {
    const kind = `${finding.severity} ${finding.code}`;
    const seen = counts.get(kind) ?? { finding, count: 0 };
    seen.count += 1;
    counts.set(kind, seen);
    return seen.count <= WRITTEN_OUT;
  });
  const left = [...counts.values()]
    .filter(({ count }) => count > WRITTEN_OUT)
    .map(({ finding, count }) => ({ finding, count: count - WRITTEN_OUT }));
  return { shown, left };
}

/** The verdict, every finding with it, cautions included, and the stops that were cleared. */
export function findingsSection(context: PdfContext): Content[] {
  const { m, locale, worksheet } = context;
  const words = m.pdf.findings;
  const { verdict, findings } = worksheet.assessment;
  const work = worksheet.workAssessment;
  const isReady = verdict === 'ready' && findings.length === 0;
  const content: Content[] = [
    sectionHead({
      title: words.title,
      note: medium(`${words.verdict}: ${enumWord(locale, 'verdict', verdict)}`),
      width: PAGE.textWidth,
    }),
    ...(isReady ? [text(words.none)] : findingList(findings, context)),
  ];
  const known = new Set(findings.map(keyOf));
  const added = work?.findings.filter((finding) => !known.has(keyOf(finding))) ?? [];
  if (work && added.length > 0) {
    content.push(subhead(words.work), ...findingList(added, context));
  }
  const cleared = worksheet.clearedStops;
  if (cleared.length > 0) {
    content.push(
      subhead(words.cleared),
      label(words.clearedText),
      ...cleared.map(({ code, path }): Content => {
        const { title } = findingWords(locale, { code, path, severity: 'stop', params: {} });
        const place = words.section(placeOf({ code, path }));
        return text(`${place}: ${title}`, { margin: [0, 2, 0, 0] });
      }),
    );
  }
  return content;
}

function keyOf({ code, path, severity }: Finding): string {
  return `${severity} ${code} ${path}`;
}
