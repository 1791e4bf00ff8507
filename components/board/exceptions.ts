import type { Citation } from '@/hazard/types';
import { dateTimeText } from '@/shared/format';
import { findingWords, type Messages } from '@/shared/messages';
import type { WorksheetRecord } from '@/shared/record';
import { placeOf } from '@/shared/sections';
import type { Locale, Units } from '@/shared/user';
import type { IconName, MarkState } from '../ui';

/** One thing that a supervisor reads before every field. */
export interface Exception {
  key: string;
  mark?: MarkState;
  icon?: IconName;
  title: string;
  note: string;
  citation?: Citation;
}

interface Reader {
  words: Messages;
  locale: Locale;
  units: Units;
}

function cleared(record: WorksheetRecord, { words, locale, units }: Reader): Exception[] {
  return record.clearedStops.map(({ code, path }) => ({
    key: `cleared ${code} ${path}`,
    mark: 'stop',
    title: words.board.cleared(placeOf({ code, path })),
    note: findingWords(locale, { code, path, severity: 'stop', params: {} }, units).title,
  }));
}

function cautions(record: WorksheetRecord, { words, locale, units }: Reader): Exception[] {
  return record.assessment.findings
    .filter(({ severity }) => severity === 'caution')
    .map((finding, index) => {
      const { title, text } = findingWords(locale, finding, units);
      return {
        key: `caution ${index} ${finding.code}`,
        mark: 'caution',
        title: words.board.caution(title),
        note: text,
        citation: finding.citation,
      };
    });
}

function questions(record: WorksheetRecord, { words }: Reader): Exception[] {
  return record.questions.map(({ id, text, askedBy, answer, answeredBy }) => ({
    key: `question ${id}`,
    icon: 'question',
    title: words.board.asked(askedBy.name, text),
    note:
      answer === null
        ? words.board.notAnswered
        : words.board.answered(answeredBy?.name ?? '', answer),
  }));
}

function energized(record: WorksheetRecord, { words }: Reader): Exception[] {
  const { decision } = record.content;
  if (decision?.mode !== 'energized') return [];
  const reasons: Readonly<Record<string, string>> = words.enumerations.reason;
  const reason = decision.reason === undefined ? words.ui.notAnswered : reasons[decision.reason];
  const permit = decision.permit?.number;
  const permitWords =
    permit !== undefined
      ? words.board.permit(permit)
      : record.assessment.permit.required
        ? words.worksheet.permitNeeded
        : words.board.noPermit;
  return [
    {
      key: 'energized',
      mark: 'energized',
      title: words.board.energizedWork(reason ?? String(decision.reason)),
      note: [decision.explanation, permitWords].filter(Boolean).join(' '),
    },
  ];
}

function signedElsewhere(record: WorksheetRecord, { words, locale }: Reader): Exception[] {
  return record.signatures
    .filter(({ revision }) => revision === record.revision)
    .flatMap((signature): Exception[] => {
      const { id, signer, enteredById, enteredByName, method, signedAt } = signature;
      const found: Exception[] = [];
      if (enteredById !== signer.id) {
        found.push({
          key: `elsewhere ${id}`,
          icon: 'pen',
          title: words.board.signedElsewhere(signer.name, enteredByName ?? words.trail.somebody),
          note: words.board.signedElsewhereNote,
        });
      }
      if (method === 'device') {
        found.push({
          key: `offline ${id}`,
          icon: 'kept',
          title: words.board.withoutSignal(signer.name),
          note: words.board.withoutSignalNote(dateTimeText(locale, signedAt, record.timeZone)),
        });
      }
      return found;
    });
}

/** The exceptions of a plan in the order of their weight; none means that nothing stands out, not that nothing can hurt. */
export function exceptionsOf(record: WorksheetRecord, reader: Reader): Exception[] {
  return [
    ...energized(record, reader),
    ...cleared(record, reader),
    ...cautions(record, reader),
    ...questions(record, reader),
    ...signedElsewhere(record, reader),
  ];
}
