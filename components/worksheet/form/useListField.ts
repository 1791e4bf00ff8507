import { useFormContext } from 'react-hook-form';

/**
 * Changes a list of the form as it stands at the press, not as it was drawn:
 * two quick presses must not undo each other.
 */
export function useListField<T>(name: string): (change: (list: T[]) => T[] | undefined) => void {
  const { getValues, setValue } = useFormContext();
  return (change) => {
    const value: unknown = getValues(name);
    const list = Array.isArray(value) ? (value as T[]) : [];
    setValue(name, change(list), { shouldDirty: true });
  };
}

/** The list with a value put in or taken out. */
export function toggled<T>(list: readonly T[], value: T, chosen: boolean): T[] {
  const others = list.filter((each) => each !== value);
  return chosen ? [...others, value] : others;
}
