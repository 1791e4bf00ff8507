import type { Messages } from '@/shared/messages';

/** `crew.1.gloves.gloveClass` has the words of `crew.gloves.gloveClass`. */
function wordKey(name: string): string {
  return name
    .split('.')
    .filter((part) => !/^\d+$/.test(part))
    .join('.');
}

export function labelOf(words: Messages, name: string): string {
  const labels: Readonly<Record<string, string>> = words.fields;
  return labels[wordKey(name)] ?? name;
}

export function hintOf(words: Messages, name: string): string | undefined {
  const hints: Readonly<Record<string, string>> = words.hints;
  return hints[wordKey(name)];
}

export type EnumerationGroup = keyof Messages['enumerations'];

/** The words of one value of a closed list; the value itself where a list has none for it. */
export function wordOf(words: Messages, group: EnumerationGroup, value: string): string {
  const list: Readonly<Record<string, string>> = words.enumerations[group];
  return list[value] ?? value;
}

/** The anchor of a field: what the error summary and the verdict bar jump to. */
export function fieldId(name: string): string {
  return `field-${name.replaceAll('.', '-')}`;
}

/** Why a field was refused, by zod's or the server's code. */
export function faultWord(words: Messages, code: string): string {
  const faults: Readonly<Record<string, string>> = words.common.fieldErrors;
  return faults[code] ?? words.common.fieldErrors.other;
}
