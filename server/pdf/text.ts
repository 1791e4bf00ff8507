import { createRequire } from 'node:module';
import type { ContentText } from 'pdfmake/interfaces';
import { fontFile } from './fonts';

interface Face {
  hasGlyphForCodePoint(codePoint: number): boolean;
}

/** What stands for a character that the typeface lacks; PDF/A admits no empty glyph. */
export const MISSING = '◊';
/** A word longer than this may be broken anywhere: it would not fit a column. */
const LONGEST_WORD = 22;

let face: Face | undefined;

/** Every weight of the typeface has the same characters. */
function barlow(): Face {
  if (face === undefined) {
    // The library that pdfmake sets type with; it has no types of its own.
    const require = createRequire(import.meta.url);
    const fontkit = require('fontkit') as { openSync(file: string): Face };
    face = fontkit.openSync(fontFile('400'));
  }
  return face;
}

const known = new Map<string, boolean>();

function isPrintable(character: string): boolean {
  const before = known.get(character);
  if (before !== undefined) return before;
  const codePoint = character.codePointAt(0) ?? 0;
  const printable = codePoint >= 0x20 && barlow().hasGlyphForCodePoint(codePoint);
  known.set(character, printable);
  return printable;
}

/**
 * A text that the typeface can set: composed, line ends and tabs tidied, and
 * what it lacks (emoji, other scripts, invisible marks that turn the reading
 * direction) replaced one for one, so that nothing disappears unseen.
 */
export function printable(text: string): string {
  const tidy = text.normalize('NFC').replace(/\r\n?/g, '\n').replace(/\t/g, ' ');
  let out = '';
  for (const character of tidy) {
    out += character === '\n' || isPrintable(character) ? character : MISSING;
  }
  return out;
}

/** A text node. The only way in which words of a person's enter the document. */
export function text(words: string, style: Omit<ContentText, 'text'> = {}): ContentText {
  const clean = printable(words);
  const isLong = clean.split(/[\s\u00a0-]/).some((word) => word.length > LONGEST_WORD);
  return { ...style, text: clean, ...(isLong && { wordBreak: 'break-all' as const }) };
}
