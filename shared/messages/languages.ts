import type { Locale } from '../user';
import { en } from './en/index';
import { es } from './es/index';
import { noBreak } from './template';
import type { Words } from './words';

/** Every word that people read: one object a subject, functions where a figure or a name goes in. */
export type Messages = Words<typeof en>;

/** The same words with no-break spaces between numbers and units, whoever wrote them. */
function keptTogether<T>(words: T): T {
  if (typeof words === 'string') return noBreak(words) as T;
  if (typeof words === 'function') {
    return ((...args: unknown[]) =>
      keptTogether((words as (...a: unknown[]) => unknown)(...args))) as T;
  }
  if (Array.isArray(words)) return (words as unknown[]).map(keptTogether) as T;
  const entries = Object.entries(words as Record<string, unknown>).map(([key, value]) => [
    key,
    keptTogether(value),
  ]);
  return Object.fromEntries(entries) as T;
}

const LANGUAGES: Readonly<Record<Locale, Messages>> = {
  'en-US': keptTogether<Messages>(en),
  'es-MX': keptTogether<Messages>(es),
};

/** The words of one language. Keys are the same in both: `messages(locale).common.buttons.save`. */
export function messages(locale: Locale): Messages {
  return LANGUAGES[locale];
}
