import type { Messages } from '@/shared/messages';
import type { Locale } from '@/shared/user';
import type { Option } from '../ui';

/** The name of a finding by its code; the code itself where this version has no words for it. */
export function findingTitle(words: Messages, code: string): string {
  const all: Readonly<Record<string, { readonly title: string } | undefined>> = words.findings;
  if (code.endsWith('.unanswered')) {
    const sections: Readonly<Record<string, string>> = words.common.sections;
    const section = sections[code.slice(0, code.indexOf('.'))] ?? code;
    return `${section}: ${words.ui.notAnswered}`;
  }
  return all[code]?.title ?? code;
}

/** Every finding that has a name, in the order of the alphabet. */
export function findingTitles(words: Messages, locale: Locale): Option<string>[] {
  return Object.entries(words.findings)
    .filter(([code]) => code.includes('.'))
    .map(([value, { title }]) => ({ value, label: title }))
    .sort((one, other) => one.label.localeCompare(other.label, locale));
}
