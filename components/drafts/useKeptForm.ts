import { useCallback, useEffect, useRef, useState } from 'react';
import { z } from 'zod';
import { keptForms } from './keptForms';

interface Options<T> {
  userId: string;
  /** What it is a form of: `proof/<worksheet>/<revision>`. */
  key: string;
  schema: z.ZodType<T>;
  initial: () => T;
}

export interface KeptForm<T> {
  value: T;
  /** ISO date-time of the last change kept on this device; null where nothing was typed. */
  keptAt: string | null;
  change: (edit: (before: T) => T) => void;
  /** After it was recorded: the device holds nothing more of it. */
  clear: () => Promise<void>;
}

const envelope = z.object({ keptAt: z.string(), form: z.unknown() });

/**
 * A form whose every change is kept on the device at once. Undefined until it
 * is known what was kept before; what no longer fits its schema is left aside.
 */
export function useKeptForm<T>({
  userId,
  key,
  schema,
  initial,
}: Options<T>): KeptForm<T> | undefined {
  const [held, setHeld] = useState<{ key: string; value: T; keptAt: string | null }>();
  const given = useRef({ schema, initial });
  const latest = useRef<T | undefined>(undefined);

  useEffect(() => {
    let current = true;
    const show = (value: T, keptAt: string | null) => {
      latest.current = value;
      setHeld({ key, value, keptAt });
    };
    keptForms
      .read(userId, key)
      .catch(() => undefined)
      .then((stored) => {
        if (!current) return;
        const kept = envelope.safeParse(stored);
        const form = given.current.schema.safeParse(kept.data?.form);
        if (kept.success && form.success) show(form.data, kept.data.keptAt);
        else show(given.current.initial(), null);
      })
      .catch(() => undefined);
    return () => {
      current = false;
    };
  }, [userId, key]);

  const change = useCallback(
    (edit: (before: T) => T) => {
      if (latest.current === undefined) return;
      const value = edit(latest.current);
      const keptAt = new Date().toISOString();
      latest.current = value;
      setHeld({ key, value, keptAt });
      // A browser that refuses storage (private window, disk full) still records.
      keptForms.keep(userId, key, { keptAt, form: value }).catch(() => undefined);
    },
    [userId, key],
  );

  const clear = useCallback(async () => {
    const value = given.current.initial();
    latest.current = value;
    setHeld({ key, value, keptAt: null });
    await keptForms.forget(userId, key).catch(() => undefined);
  }, [userId, key]);

  return held?.key === key ? { value: held.value, keptAt: held.keptAt, change, clear } : undefined;
}
