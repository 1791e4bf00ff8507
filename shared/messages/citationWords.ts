import type { Citation } from '@/hazard/types';
import type { Locale } from '../user';
import { citationParts } from './es/citations';
import { enumWord } from './enumWord';
import { messages } from './languages';
import { noBreak } from './template';

/** Editions that say nothing to a reader: a regulation is the one in force. */
const UNSAID_EDITIONS = ['', 'in force', '1', 'public report'];
/** 29 CFR 1910.333: the part is printed once, in the section's own number. */
const CODE_OF_REGULATIONS = /^(.* CFR )(\d+)$/;

function placeOf({ standard, edition, table }: Citation, ownRule: string): string {
  const part = CODE_OF_REGULATIONS.exec(standard);
  if (part && table.startsWith(String(part[2]))) return `${part[1]}${table}`;
  if (standard === 'Common practice') return table;
  if (standard === 'Wideberth') return `${ownRule}: ${table}`;
  if (UNSAID_EDITIONS.includes(edition)) return `${standard} ${table}`;
  return standard === 'NFPA 70E'
    ? `${standard}-${edition} ${table}`
    : `${standard}, ${edition}, ${table}`;
}

/** Where a figure or a rule comes from: `NFPA 70E-2024 Table 130.5(C)`. */
export function citationPlace(locale: Locale, citation: Citation): string {
  const printed = placeOf(citation, messages(locale).citations.ownRule);
  const place =
    locale === 'es-MX'
      ? citationParts.reduce((text, { from, to }) => text.replaceAll(from, to), printed)
      : printed;
  return noBreak(place);
}

/** The same, and how it was checked: `NFPA 70E-2024 Table 130.5(C). From memory, to be checked`. */
export function citationWords(locale: Locale, citation: Citation): string {
  return `${citationPlace(locale, citation)}. ${enumWord(locale, 'confidence', citation.confidence)}`;
}
