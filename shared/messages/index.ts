import type { Locale } from '../user';
import { en } from './en/index';
import { es } from './es/index';
import type { Words } from './words';

/** Every word that people read: one object a subject, functions where a figure or a name goes in. */
export type Messages = Words<typeof en>;

const LANGUAGES: Readonly<Record<Locale, Messages>> = { 'en-US': en, 'es-MX': es };

/** The words of one language. Keys are the same in both: `messages(locale).common.save`. */
export function messages(locale: Locale): Messages {
  return LANGUAGES[locale];
}
