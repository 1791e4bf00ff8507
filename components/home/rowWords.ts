import { timeText } from '@/shared/format';
import type { Messages } from '@/shared/messages';
import type { WorksheetRow } from '@/shared/record';
import type { MarkState } from '../ui';

/** What the list knows of a row, as the mark that stands before it. */
export function rowMark(row: WorksheetRow): MarkState {
  switch (row.state) {
    case 'in-force':
      return row.mode === 'energized' ? 'energized' : row.proved ? 'proved' : 'not-proved';
    case 'stopped':
    case 'expired':
      return 'stop';
    case 'briefing':
    case 'countersign':
      return 'waits';
    case 'draft':
      return row.verdict === 'stop' ? 'stop' : row.verdict === 'ready' ? 'ready' : 'open';
    case 'returned':
      return 'open';
    case 'closed':
    case 'void':
      return 'complete';
  }
}

/** The state in words, as it stands under the name of a row. */
export function rowState(row: WorksheetRow, { home }: Messages): string {
  const { state } = home;
  switch (row.state) {
    case 'draft':
      return state.draft(row.counts.stop, row.counts.open);
    case 'briefing':
      return state.briefing(row.awaiting.length);
    case 'in-force':
      if (row.mode === 'energized') return state.energized;
      return row.proved ? state.proved : state.notProved;
    default:
      return state[row.state];
  }
}

export function taskWords(row: WorksheetRow, { enumerations, home }: Messages): string {
  const words = enumerations.task as Readonly<Record<string, string>>;
  return (row.task !== null ? words[row.task] : undefined) ?? home.noTask;
}

/** Site and area in one phrase. */
export function placeWords(row: WorksheetRow, { home }: Messages): string {
  const parts = [row.siteName, row.area].filter((part) => part !== null && part !== '');
  return parts.length > 0 ? parts.join(', ') : home.noPlace;
}

export function endWords(row: WorksheetRow, { home }: Messages): string | undefined {
  return row.endsAt === null ? undefined : home.until(timeText(row.endsAt, row.timeZone));
}

/** A task inside a sentence: `replace a lamp`. No task begins with a name or an abbreviation. */
export function inSentence(words: string): string {
  return words.charAt(0).toLowerCase() + words.slice(1);
}

/** Why it was stopped or returned, quoted; a ready reason in the reader's language. */
export function reasonWords(
  row: WorksheetRow,
  { enumerations, home }: Messages,
): string | undefined {
  if (row.reason === null || row.reason === '') return undefined;
  const ready = enumerations.stopReason as Readonly<Record<string, string>>;
  return home.quoted(ready[row.reason] ?? row.reason);
}
