import type { Content, TableCell } from 'pdfmake/interfaces';
import { enumWord } from '@/shared/messages';
import type { PdfContext } from './context';
import { headCell, label, medium, PAGE, rows, sectionHead, strong } from './style';
import { text } from './text';

/** Questions with their answers, the revisions, and what happened in order. */
export function trail(context: PdfContext): Content[] {
  return [...questions(context), ...revisions(context), ...events(context)];
}

function questions({ m, worksheet, at }: PdfContext): Content[] {
  const words = m.pdf.questions;
  const title = sectionHead({ title: words.title, width: PAGE.textWidth });
  if (worksheet.questions.length === 0) return [title, label(words.none)];
  return [
    title,
    ...worksheet.questions.flatMap((question): Content[] => [
      label(words.asked(question.askedBy.name, at(question.askedAt)), { margin: [0, 3, 0, 0] }),
      strong(question.text),
      ...(question.answer === null
        ? [text(words.notAnswered)]
        : [
            label(
              words.asked(
                question.answeredBy?.name ?? '',
                at(question.answeredAt ?? question.askedAt),
              ),
            ),
            text(question.answer),
          ]),
    ]),
  ];
}

function revisions({ m, locale, revisions: all, worksheet, at }: PdfContext): Content[] {
  if (all.length === 0) return [];
  const words = m.pdf.revisions;
  const body: TableCell[][] = [
    [words.revision, words.created, words.by, words.state, words.hash].map((name) =>
      headCell(name),
    ),
    ...all.map((each) => [
      medium(
        each.revision === worksheet.revision
          ? `${each.revision}, ${words.this}`
          : String(each.revision),
      ),
      text(at(each.createdAt)),
      text(each.createdByName),
      text(each.state === '' ? '' : enumWord(locale, 'state', each.state)),
      // The hash stands whole: a hash that is cut proves nothing.
      text(each.contentHash, { fontSize: 6.75, wordBreak: 'break-all' }),
    ]),
  ];
  return [
    sectionHead({ title: words.title, width: PAGE.textWidth }),
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        widths: [50, 92, 76, 56, '*'],
        body,
        dontBreakRows: true,
      },
      layout: rows,
    },
  ];
}

function events({ m, events: all, at }: PdfContext): Content[] {
  const words = m.pdf.events;
  const names: Readonly<Record<string, string>> = words.names;
  const title = sectionHead({ title: words.title, width: PAGE.textWidth });
  if (all.length === 0) return [title, label(words.none)];
  const body: TableCell[][] = [
    [words.at, words.event, words.by].map((name) => headCell(name)),
    ...all.map((event) => {
      const who = event.actorName ?? words.clock;
      const entered = event.enteredByName ? `, ${words.entered(event.enteredByName)}` : '';
      return [
        text(at(event.at)),
        medium(names[event.type] ?? event.type),
        text(`${who}${entered}`),
      ];
    }),
  ];
  return [
    title,
    {
      table: {
        headerRows: 1,
        keepWithHeaderRows: 1,
        widths: [130, '*', 200],
        body,
        dontBreakRows: true,
      },
      layout: rows,
    },
  ];
}
