import type { Locale } from '../user';
import { messages, type Messages } from './languages';

/** The closed lists that have words: `system`, `task`, `openedAt` and so on. */
export type EnumGroup = keyof Messages['enumerations'];

/** The word for one value of a closed list; the value itself where it has none. */
export function enumWord(locale: Locale, group: EnumGroup, value: string): string {
  const words: Readonly<Record<string, string>> = messages(locale).enumerations[group];
  return words[value] ?? value;
}

export function isEnumGroup(name: string): name is EnumGroup {
  return name in messages('en-US').enumerations;
}
