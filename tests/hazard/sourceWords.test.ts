import { expect, it } from 'vitest';
import { readAnswers } from '@/hazard/engine/answers';
import { readSources, sourceParams } from '@/hazard/engine/sources';

it('a source is named in the words by what was answered of it', () => {
  const sources = [
    { kind: 'normal', from: 'LA-1 ckt 7' },
    { kind: 'normal' },
    { from: 'LA-1' },
    {},
  ];
  expect(readSources(readAnswers({ sources })).map(sourceParams)).toStrictEqual([
    { index: 0, kind: 'normal', from: 'LA-1 ckt 7' },
    { index: 1, kind: 'normal' },
    { index: 2, from: 'LA-1' },
    { index: 3 },
  ]);
});
