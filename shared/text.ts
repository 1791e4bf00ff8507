import { z } from 'zod';

/** PostgreSQL refuses U+0000 and RFC 8785 refuses unpaired surrogates: both are bad input, not a fault. */

const unstorable = /\u0000|[\uD800-\uDBFF](?![\uDC00-\uDFFF])|(?<![\uD800-\uDBFF])[\uDC00-\uDFFF]/;

/** Text of at most `max` characters that the database and the canonical form can hold. */
export function text(max = 200) {
  return z
    .string()
    .max(max)
    .refine((value) => !unstorable.test(value), {
      error: 'unstorable',
      params: { code: 'unstorable' },
    });
}

/** Text that must say something. */
export function requiredText(max = 200) {
  return text(max).refine((value) => value.trim() !== '', {
    error: 'empty',
    params: { code: 'empty' },
  });
}

/** An ISO 8601 date-time with its offset. */
export const dateTime = z.iso.datetime({ offset: true });

/** A calendar date, `YYYY-MM-DD`. */
export const date = z.iso.date();

/** Any RFC 9562 UUID, in lower case: a client may choose the id of what it creates. */
export const id = z.uuid().transform((value) => value.toLowerCase());
