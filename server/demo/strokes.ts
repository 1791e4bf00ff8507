import type { Strokes } from '@/shared/record';

/** A small repeatable generator (mulberry32): the same name is always drawn the same way. */
function generator(seed: string): () => number {
  let state = [...seed].reduce((sum, letter) => (sum * 31 + letter.charCodeAt(0)) | 0, 7);
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}

const rounded = (value: number) => Math.round(value * 10) / 10;

/** One word in one stroke: a tall first letter, then loops that lean and grow smaller. */
function word(letters: number, left: number, random: () => number): Strokes[number] {
  const points: Strokes[number] = [];
  let x = left;
  for (let letter = 0; letter < letters; letter += 1) {
    const height = letter === 0 ? 42 + random() * 14 : 9 + random() * 13;
    const width = letter === 0 ? 24 : 11 + random() * 6;
    for (let step = 0; step < 9; step += 1) {
      const turn = (step / 9) * Math.PI * 2;
      const across = x + (width * step) / 9 + Math.sin(turn) * width * 0.35;
      points.push([rounded(across), rounded(92 - height * (0.5 - 0.5 * Math.cos(turn)))]);
    }
    x += width;
  }
  return points;
}

/** A signature as a finger draws it: two words and a line under them. */
export function drawnSignature(name: string): Strokes {
  const random = generator(name);
  const [first = name, last = ''] = name.split(' ');
  const firstWord = word(Math.min(first.length, 7), 24, random);
  const end = (firstWord.at(-1)?.[0] ?? 100) + 16;
  const lastWord = word(Math.max(2, Math.min(last.length, 9)), end, random);
  const right = (lastWord.at(-1)?.[0] ?? 240) + 8;
  const line: Strokes[number] = Array.from({ length: 12 }, (_, step) => [
    rounded(30 + ((right - 30) * step) / 11),
    rounded(108 - Math.sin((step / 11) * Math.PI) * 6 + random()),
  ]);
  return [firstWord, lastWord, line];
}
