import { useFormContext, useWatch } from 'react-hook-form';

/**
 * A list of the form, as typed at this moment, and a way to change it as it
 * stands at the press, not as it was drawn: two quick presses must not undo
 * each other.
 */
export function useListField<T>(
  name: string,
): [list: readonly T[], change: (changed: (list: readonly T[]) => readonly T[]) => void] {
  const { getValues, setValue } = useFormContext();
  const asList = (value: unknown): readonly T[] => (Array.isArray(value) ? (value as T[]) : []);
  const list = asList(useWatch({ name }));
  const change = (changed: (list: readonly T[]) => readonly T[]) =>
    setValue(name, changed(asList(getValues(name))), { shouldDirty: true });
  return [list, change];
}

/** The list with a value put in or taken out. */
export function toggled<T>(list: readonly T[], value: T, chosen: boolean): T[] {
  const others = list.filter((each) => each !== value);
  return chosen ? [...others, value] : others;
}
