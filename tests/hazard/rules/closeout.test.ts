import { describe, expect, it } from 'vitest';
import type { Base, Edits, RuleRow } from '../../support/ruleTable';
import { assessBase, describeRule, eachValue, gone, onEach } from '../../support/ruleTable';

const CLOSES: Base[] = ['O close', 'T close', 'W close'];
const BATTERY = { id: 'b1', kind: 'battery unit', from: 'Unit over door 1' };
const INVERTER = { id: 'i1', kind: 'central inverter', from: 'Inverter room' };

describe('close-out looks only at the C rows', () => {
  it.each(CLOSES)('%s: ready', (base) => {
    expect(assessBase(base).findings).toEqual([]);
  });

  it('a worksheet that broke everything else can be closed', () => {
    const result = assessBase('O close', {
      'sources/0/openedAt': 'none',
      'supply/damage': true,
      'crew/1': gone,
      'surroundings/wet': true,
      'job/special': ['utility side'],
      proof: gone,
      on: '2027-01-05T09:00:00-06:00',
    });
    expect(result.verdict).toBe('ready');
  });

  it.each(CLOSES)('%s: without a close-out it is open and holds no stop', (base) => {
    const result = assessBase(base, { closeOut: gone });
    expect(result.verdict).toBe('open');
    expect(result.findings.every(({ path }) => path.startsWith('/closeOut'))).toBe(true);
  });
});

describeRule('closeout.not-cleared', '1910.333(b)(2)(v)(A), (B), (D)', [
  ...['toolsClear', 'peopleWarned', 'peopleClear'].flatMap((key) => [
    ...eachValue(CLOSES, `closeOut/${key}`, [true], []),
    ...eachValue(CLOSES, `closeOut/${key}`, [false], [`stop /closeOut/${key}`]),
    ...eachValue(CLOSES, `closeOut/${key}`, [gone, '', 'yes'], [`open /closeOut/${key}`]),
  ]),
  ...onEach(
    CLOSES,
    'in this order',
    { 'closeOut/peopleClear': false, 'closeOut/toolsClear': false, 'closeOut/peopleWarned': gone },
    ['stop /closeOut/toolsClear', 'open /closeOut/peopleWarned', 'stop /closeOut/peopleClear'],
  ),
  ['O', 'not at the plan', {}, []],
]);

const REMOVED = 'closeOut/locksRemoved';
const RESTORED = 'closeOut/restored';
describeRule('closeout.locks-left', '1910.333(b)(2)(v)(C)', [
  ['O close', 'removed', {}, []],
  ...eachValue(['O close'], REMOVED, [false, gone, 'yes'], ['open /closeOut/locksRemoved']),
  ...eachValue(['O close'], RESTORED, [false], ['caution']),
  ...eachValue(['O close'], REMOVED, [false], ['caution'], [], { [RESTORED]: false }),
  ...eachValue(
    ['O close'],
    RESTORED,
    [gone, '', 'yes'],
    ['open /closeOut/restored'],
    ['closeout.*'],
  ),
  [
    'W close',
    'mode not answered: the rules of the off path',
    { 'decision/mode': gone, [REMOVED]: false },
    ['open /closeOut/locksRemoved'],
  ],
  ...onEach(['T close', 'W close'], 'not asked', { [REMOVED]: gone, [RESTORED]: gone }, []),
  ...onEach(['T close', 'W close'], 'not asked, no', { [REMOVED]: false, [RESTORED]: false }, []),
]);

const COVERS = 'closeOut/coversOn';
describeRule('closeout.covers-off', '1910.333(b)(2)(v), (c)', [
  ...onEach(CLOSES, 'on', {}, []),
  ...eachValue(CLOSES, COVERS, [false], ['stop /closeOut/coversOn']),
  ...eachValue(CLOSES, COVERS, [gone, '', 'yes'], ['open /closeOut/coversOn']),
  ...eachValue(['T close', 'W close'], COVERS, [false], ['stop /closeOut/coversOn'], [], {
    [RESTORED]: gone,
  }),
  ...eachValue(['O close'], COVERS, [false], [], [], { [RESTORED]: false }),
]);

const SECONDS = 'closeOut/egressTestedSeconds';
const LIT = 'closeOut/egressLit';
const BY_BATTERY: Edits = { 'sources/3': BATTERY, egressSupply: ['battery units'] };
describeRule('closeout.egress-untested', 'NFPA 101 7.9.3; own policy', [
  ['O close', 'a generator, seen lit', {}, []],
  ...eachValue(['O close'], LIT, [false, gone, 'yes'], ['open /closeOut/egressLit']),
  ...eachValue(['O close'], SECONDS, [30, 90], [], [], BY_BATTERY),
  ...eachValue(
    ['O close'],
    SECONDS,
    [29.9, 0, gone, '', NaN],
    ['open /closeOut/egressTestedSeconds'],
    [],
    BY_BATTERY,
  ),
  ...eachValue(['O close'], SECONDS, [0, gone], ['open /closeOut/egressTestedSeconds'], [], {
    'sources/3': INVERTER,
    egressSupply: ['central inverter'],
  }),
  ...eachValue(['O close'], SECONDS, [0], ['open /closeOut/egressTestedSeconds'], [], {
    'sources/3': BATTERY,
    egressSupply: ['none after checking'],
  }),
  ...eachValue(['O close'], LIT, [gone], [], [], { egressSupply: ['none after checking'] }),
  ...eachValue(['O close'], LIT, [gone], [], [], {
    egressReaches: 'other equipment only, checked',
  }),
  ...eachValue(['O close'], LIT, [gone], ['open /closeOut/egressLit'], [], { egressReaches: gone }),
  [
    'O close',
    'both kinds',
    { 'sources/3': BATTERY, egressSupply: ['battery units', 'generator'], [LIT]: false },
    ['open', 'open'],
  ],
  [
    'O close',
    'not restored',
    { ...BY_BATTERY, [RESTORED]: false, [LIT]: gone, [SECONDS]: gone },
    [],
  ],
  ...onEach(
    ['T close', 'W close'],
    'energized',
    { ...BY_BATTERY, [LIT]: gone, [SECONDS]: gone },
    [],
  ),
] satisfies RuleRow[]);
