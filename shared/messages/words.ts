/**
 * The shape of a set of words with every text widened: a language that lacks a
 * key, has one too many or takes other arguments is a type error.
 */
export type Words<T> = T extends string
  ? string
  : T extends (...args: infer A) => infer R
    ? (...args: A) => Words<R>
    : T extends readonly (infer I)[]
      ? readonly Words<I>[]
      : { readonly [K in keyof T]: Words<T[K]> };
