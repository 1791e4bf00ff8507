import { describe, expect, it } from 'vitest';
import type { RuleRow } from '../../../support/ruleTable';
import { assessBase, describeRule, found, gone, unsettled } from '../../../support/ruleTable';

describe('not answered (convention 1)', () => {
  it('false, 0 and [] are answers', () => {
    expect(unsettled(assessBase('O', { 'surroundings/groundedSurfaces': [] }))).toEqual([]);
    expect(unsettled(assessBase('O', { 'supply/conductorColors': [], 'supply/watts': 0 }))).toEqual(
      [],
    );
  });

  it('[] of the four lists is no answer', () => {
    expect(unsettled(assessBase('O', { 'job/special': [] }))).toEqual([
      'open job.outside-scope /job/special',
    ]);
    expect(unsettled(assessBase('O', { egressSupply: [] }))).toEqual([
      'open sources.egress-unknown /egressSupply',
    ]);
    expect(
      found(assessBase('O', { 'supply/switching': [] }), 'sources.control-unlisted'),
    ).toHaveLength(1);
  });
});

describeRule('sources.not-locked', 'convention 2: half an answer is a stop', [
  [
    'O',
    'a tag whose extra measure is missing',
    { 'sources/0/held': 'tag', 'sources/0/extraMeasure': gone },
    ['stop /sources/0/*'],
  ],
] satisfies RuleRow[]);
