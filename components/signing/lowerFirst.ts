/** A word of ours inside a sentence: `Battery unit` becomes `battery unit`, `CAT III` stays. */
export function lowerFirst(text: string): string {
  return /^\p{Lu}[\p{Lu}\d]/u.test(text) ? text : text.charAt(0).toLowerCase() + text.slice(1);
}
