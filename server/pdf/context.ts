import type { Citation } from '@/hazard/types';
import { dateTimeText, timeText } from '@/shared/format';
import { citationWords, messages, type Messages } from '@/shared/messages';
import type { Locale, Units } from '@/shared/user';
import type { PdfInput, PdfLanguage } from './input';

/** Print has feet and inches first, and the published metres behind. */
export const PRINT_UNITS: Units = 'feet';

export interface PdfContext extends PdfInput {
  locale: Locale;
  m: Messages;
  /** Date, clock and zone at the site. */
  at: (instant: string) => string;
  clock: (instant: string) => string;
  /** A source with its confidence; `‡` marks what is from memory. */
  source: (citation: Citation) => string;
  /** A crew member's name by the id inside the worksheet. */
  crewName: (id: string | undefined) => string;
  /** `3.2` for a source's id. */
  wayNumber: (id: string | undefined) => string;
}

/**
 * The place of a source alone, as the first page has room for it: the words of
 * its confidence and what older editions call it stand in section 6.
 */
export function shortSource(citation: Citation, locale: Locale): string {
  const whole = citationWords(locale, citation);
  const place = whole
    .slice(0, whole.lastIndexOf('. '))
    .replace(/\s\(\d{4}.*\)$/, '')
    .replace(/,.*$/, '');
  return `${place}${memoryMark(citation)}`;
}

/** The mark of a figure that is still to be checked against a licensed copy. */
export function memoryMark(citation: Pick<Citation, 'confidence'>): string {
  return citation.confidence === 'memory' ? ' ‡' : '';
}

export function contextOf(input: PdfInput, language: PdfLanguage): PdfContext {
  const locale: Locale = language === 'es' ? 'es-MX' : 'en-US';
  const m = messages(locale);
  const { timeZone, content } = input.worksheet;
  return {
    ...input,
    locale,
    m,
    at: (instant) => dateTimeText(locale, instant, timeZone),
    clock: (instant) => timeText(instant, timeZone),
    source: (citation) => `${citationWords(locale, citation)}${memoryMark(citation)}`,
    crewName(id) {
      const member = content.crew?.find((each) => each.id === id);
      return id === undefined ? '' : (member?.name ?? id);
    },
    wayNumber(id) {
      const index = content.sources?.findIndex((each) => each.id === id) ?? -1;
      return index === -1 ? (id ?? '') : `3.${index + 1}`;
    },
  };
}
