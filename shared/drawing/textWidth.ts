import { BARLOW_WIDTHS, FIRST_CHARACTER } from './barlowWidths';

export type Weight = 500 | 600 | 700;

/** A character outside the table (it is then set in a fallback face) counts as a full em. */
const UNKNOWN = 1000;

/**
 * Width in px of a line of Barlow. Kerning is left out: it only ever draws
 * letters closer by a fraction of a px, so a line never comes out wider.
 */
export function textWidth(text: string, size: number, weight: Weight): number {
  const widths = BARLOW_WIDTHS[weight];
  let thousandths = 0;
  for (const character of text) {
    // Half of a pair tells nothing, but no character of the table needs a pair.
    const index = character.charCodeAt(0) - FIRST_CHARACTER;
    thousandths += widths[index] || UNKNOWN;
  }
  return (thousandths * size) / 1000;
}

/** Breaks a text at its spaces into lines that fit; a word that is longer stays whole. */
export function wrapText(
  text: string,
  { size, weight, width }: { size: number; weight: Weight; width: number },
): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.at(-1);
    if (last !== undefined && textWidth(`${last} ${word}`, size, weight) <= width) {
      lines[lines.length - 1] = `${last} ${word}`;
    } else {
      lines.push(word);
    }
  }
  return lines;
}
