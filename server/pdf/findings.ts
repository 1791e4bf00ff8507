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
  const body = findings.map((finding): TableCell[] => {
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
  ];
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
