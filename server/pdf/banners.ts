import type { Content } from 'pdfmake/interfaces';
import { enumWord } from '@/shared/messages';
import type { PdfContext } from './context';
import { bold, COLORS, PAGE } from './style';
import { stateSvg } from './svg';
import { text } from './text';

interface Banner {
  state: 'energized' | 'not-proved' | 'not-in-force';
  title: string;
  text: string;
}

/** Why the sheet is not in force, or null when it is. */
function notInForce(context: PdfContext): Banner | null {
  const { worksheet, latestRevision, m, at } = context;
  const words = m.pdf.banner;
  const state = 'not-in-force';
  if (latestRevision > worksheet.revision) {
    return { state, title: words.superseded(latestRevision), text: words.supersededText };
  }
  const { reason } = worksheet;
  const because = reason
    ? words.reasonBy(stopReason(reason.text, context), reason.byName, at(reason.at))
    : '';
  switch (worksheet.state) {
    case 'draft':
      return { state, title: words.draft, text: words.draftText };
    case 'briefing':
      return { state, title: words.briefing, text: words.waitingText };
    case 'countersign':
      return { state, title: words.countersign, text: words.waitingText };
    case 'returned':
      return { state, title: words.returned, text: because };
    case 'stopped':
      return { state, title: words.stopped, text: because };
    case 'void':
      return { state, title: words.void, text: because };
    case 'expired':
      return { state, title: words.expired, text: words.expiredText };
    case 'in-force':
    case 'closed':
      return null;
  }
}

/** A ready reason in the reader's words; own words as they are. */
function stopReason(reason: string, { locale }: PdfContext): string {
  return enumWord(locale, 'stopReason', reason);
}

/** What must be seen before anything else on the sheet. */
export function banners(context: PdfContext): Banner[] {
  const { worksheet, m } = context;
  const words = m.pdf.banner;
  const shown: Banner[] = [];
  const blocked = notInForce(context);
  if (blocked) shown.push(blocked);
  const mode = worksheet.content.decision?.mode;
  if (mode === 'energized') {
    shown.push({ state: 'energized', title: words.energized, text: words.energizedText });
  } else if (!blocked && worksheet.state === 'in-force' && !worksheet.proved) {
    shown.push({ state: 'not-proved', title: words.notProved, text: words.notProvedText });
  }
  const open = worksheet.questions.filter(({ answer }) => answer === null).length;
  if (open > 0) {
    shown.push({ state: 'not-in-force', title: words.questions(open), text: words.questionsText });
  }
  return shown;
}

/** The one line that every further page repeats. */
export function bannerLine(context: PdfContext): string | null {
  const titles = banners(context).map(({ title }) => title);
  return titles.length > 0 ? titles.join('. ') : null;
}

export function bannersOf(context: PdfContext): Content[] {
  return banners(context).map(({ state, title, text: words }): Content => {
    const solid = state === 'not-proved';
    const ink = solid ? COLORS.onRed : COLORS.ink;
    const line = state === 'energized' ? COLORS.red : COLORS.ink;
    return {
      table: {
        widths: [18, PAGE.textWidth - 18 - 28],
        body: [
          [
            { svg: stateSvg(state), width: 13, margin: [0, 1, 0, 0] },
            {
              text: [
                bold(`${title}${words ? '.  ' : ''}`, { fontSize: 12, color: ink }),
                ...(words ? [text(words, { color: ink })] : []),
              ],
            },
          ],
        ],
        dontBreakRows: true,
      },
      layout: {
        hLineWidth: () => 2,
        vLineWidth: (column) => (column === 1 ? 0 : 2),
        hLineColor: () => line,
        vLineColor: () => line,
        fillColor: () => (solid ? COLORS.ink : null),
        paddingLeft: () => 8,
        paddingRight: () => 4,
        paddingTop: () => 3,
        paddingBottom: () => 4,
      },
      margin: [0, 0, 0, 6],
    };
  });
}
