import { CONDUCTORS } from '@/hazard/enumerations';
import { reading as readingText } from '@/shared/format';
import type { ProofRecord } from '@/shared/record';
import type { Proof } from '@/shared/worksheet';
import type { PdfContext } from './context';

type Reading = NonNullable<Proof['readings']>[number];

/** One line of the matrix: a point, and where it matters the current and whose conductors. */
export interface ReadingLine {
  point: string;
  detail: string;
  at: string;
  /** By pair, in the order of `pairs`; a pair that was not read is empty. */
  cells: string[];
}

export interface ReadingMatrix {
  pairs: string[];
  lines: ReadingLine[];
  /** Readings that name no point or pair, in words. */
  incomplete: string[];
}

/** From the own conductor of a source, which has no letter. */
const OWN = 'own';

function pairOf({ from, to, sourceId }: Reading): string | null {
  if (to === undefined) return null;
  if (from === undefined) return sourceId === undefined ? null : `${OWN} ${to}`;
  const order = (conductor: string) => CONDUCTORS.findIndex((each) => each === conductor);
  const [first, second] = order(from) <= order(to) ? [from, to] : [to, from];
  return `${first} ${second}`;
}

function figure(reading: Reading, { locale, m }: PdfContext): string {
  if (reading.volts === undefined) return m.pdf.fields.notAnswered;
  // The unit stands in the head of the table.
  const volts = readingText(locale, reading.volts).replace(/\u00a0V$/, '');
  return reading.lowImpedance ? `${volts} (${m.pdf.test.lowImpedance})` : volts;
}

/** Every reading of a proof, one line a point; two readings of a pair stand in their order. */
export function readingMatrix({ proof, at }: ProofRecord, context: PdfContext): ReadingMatrix {
  const words = context.m.pdf.test;
  const pairs = new Set<string>();
  const incomplete: string[] = [];
  const lines = new Map<string, ReadingLine & { byPair: Map<string, string[]> }>();
  for (const reading of proof.readings ?? []) {
    const pair = pairOf(reading);
    if (pair === null || reading.point === undefined) {
      const place = [reading.point, reading.from, reading.to].filter(Boolean).join(' ');
      incomplete.push(`${place || words.noPoint}: ${figure(reading, context)}`);
      continue;
    }
    pairs.add(pair);
    const details = [
      reading.current === 'dc' ? words.dc : '',
      reading.sourceId ? words.ofSource(context.wayNumber(reading.sourceId)) : '',
    ].filter((detail) => detail !== '');
    const detail = details.join(', ');
    const key = JSON.stringify([reading.point, detail]);
    const line = lines.get(key) ?? {
      point: reading.point,
      detail,
      at: '',
      cells: [],
      byPair: new Map<string, string[]>(),
    };
    line.at = context.clock(reading.at ?? at);
    const given = line.byPair.get(pair) ?? [];
    line.byPair.set(pair, [...given, figure(reading, context)]);
    lines.set(key, line);
  }
  const all = [
    ...CONDUCTORS.flatMap((one, index) =>
      CONDUCTORS.slice(index).map((other) => `${one} ${other}`),
    ),
    ...CONDUCTORS.map((other) => `${OWN} ${other}`),
  ].filter((pair) => pairs.has(pair));
  return {
    pairs: all.map((pair) => {
      const [from = '', to = ''] = pair.split(' ');
      return from === OWN ? words.own(to) : context.m.common.fallback.pair(from, to);
    }),
    lines: [...lines.values()].map(({ byPair, ...line }) => ({
      ...line,
      cells: all.map((pair) => (byPair.get(pair) ?? []).reduce(joined(words.then), '')),
    })),
    incomplete,
  };
}

function joined(then: (first: string, second: string) => string) {
  return (before: string, next: string) => (before === '' ? next : then(before, next));
}
