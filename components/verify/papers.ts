const NUMBER = /^\d{4}-\d{6,12}$/;
const HASH = /^[0-9a-f]{64}$/;
/** Dashes of a word processor and of a phone's keyboard. */
const DASHES = /[\u2010-\u2015\u2212]/g;

export interface Paper {
  number: string;
  hash: string;
}

export type PaperFault = 'number' | 'code-length' | 'code-letters';

/** What somebody typed or scanned from a paper, without spaces and in one spelling. */
export function readPaper(typed: Paper): Paper & { faults: PaperFault[] } {
  const number = typed.number.replace(DASHES, '-').replace(/\s/g, '');
  const hash = typed.hash.replace(/\s/g, '').toLowerCase();
  const faults: PaperFault[] = [];
  if (!NUMBER.test(number)) faults.push('number');
  if (hash.length !== 64) faults.push('code-length');
  else if (!HASH.test(hash)) faults.push('code-letters');
  return { number, hash, faults };
}
