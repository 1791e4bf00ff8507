import { useFormContext } from 'react-hook-form';

/** Sets one field of the form as if it had been typed. */
export function useSetField(name: string): (value: unknown) => void {
  const { setValue } = useFormContext();
  return (value) => setValue(name, value, { shouldDirty: true });
}
