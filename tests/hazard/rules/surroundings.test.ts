import { JOB_TASKS } from '@/hazard';
import { BELOW_FIFTY } from '../../support/ruleEdits';
import type { Edits, RuleRow } from '../../support/ruleTable';
import { ALL, describeRule, eachValue, ENERGIZED, gone, onEach } from '../../support/ruleTable';

const ACCESS = 'surroundings/access';
const LADDER = 'surroundings/ladder';
const EXTENSION: Edits = { [ACCESS]: 'extension ladder' };
const FLOOR: Edits = { [ACCESS]: 'floor', [LADDER]: gone, 'surroundings/ceilingHeightFeet': gone };

const MATERIAL = `${LADDER}/material`;
describeRule('surroundings.ladder-conductive', '1910.333(c)(7); 1926.1053(b)(12)', [
  ...[{}, EXTENSION].flatMap((others) => [
    ...eachValue(ALL, MATERIAL, ['fiberglass', 'wood'], [], [], others),
    ...eachValue(
      ALL,
      MATERIAL,
      ['aluminum', 'other conductive'],
      ['stop /surroundings/ladder/material'],
      [],
      others,
    ),
    ...eachValue(
      ALL,
      MATERIAL,
      [gone, '', 'rope', 1],
      ['open /surroundings/ladder/material'],
      [],
      others,
    ),
    ...eachValue(
      ALL,
      LADDER,
      [gone, 'x'],
      ['open /surroundings/ladder*'],
      ['surroundings.ladder-*'],
      others,
    ),
  ]),
  ...onEach(ALL, 'no ladder', FLOOR, []),
  ...onEach(
    ALL,
    'a platform beside an aluminum ladder',
    { [ACCESS]: 'platform', [MATERIAL]: 'aluminum' },
    [],
  ),
]);

const STANDING = `${LADDER}/standingLevelFeet`;
describeRule('surroundings.ladder-top', '1926.1053(b)(13); 2 ft common practice', [
  ...eachValue(ALL, STANDING, [4, 2], []),
  ...eachValue(ALL, STANDING, [4.1, 5, 6], ['stop /surroundings/ladder/standingLevelFeet']),
  ...eachValue(ALL, STANDING, [gone, '', NaN, -2], ['open /surroundings/ladder/standingLevelFeet']),
  ...eachValue(ALL, STANDING, [6], [], [], { [`${LADDER}/sizeFeet`]: 8 }),
  ...onEach(
    ALL,
    'the size is not answered',
    { [`${LADDER}/sizeFeet`]: gone },
    ['?open /surroundings/ladder/sizeFeet'],
    ['surroundings.ladder-short'],
  ),
  ...onEach(ALL, 'no stepladder', { ...EXTENSION, [STANDING]: 6 }, []),
  ...onEach(ALL, 'no ladder', FLOOR, []),
]);

const CEILING_HEIGHT = 'surroundings/ceilingHeightFeet';
describeRule('surroundings.ladder-short', 'common practice; 1926.1053(b)(6), (8)', [
  ...eachValue(ALL, CEILING_HEIGHT, [9, 8], []),
  ...eachValue(ALL, CEILING_HEIGHT, [9.1, 12], ['stop']),
  ...eachValue(ALL, CEILING_HEIGHT, [20, 1000], ['stop'], [], { [`${LADDER}/sizeFeet`]: 16 }),
  ...eachValue(ALL, CEILING_HEIGHT, [19], [], [], { [`${LADDER}/sizeFeet`]: 16 }),
  ...eachValue(ALL, CEILING_HEIGHT, [gone, '', NaN, -9], ['open /surroundings/ceilingHeightFeet']),
  ...eachValue(ALL, `${LADDER}/sizeFeet`, [4], ['stop'], ['surroundings.ladder-top']),
  ...eachValue(
    ALL,
    `${LADDER}/sizeFeet`,
    [gone, '', 'six'],
    ['open /surroundings/ladder/sizeFeet'],
    ['surroundings.ladder-top'],
  ),
  ...eachValue(ALL, `${LADDER}/placed`, [false], ['stop /surroundings/ladder/placed']),
  ...eachValue(ALL, `${LADDER}/placed`, [gone, '', 'yes'], ['open /surroundings/ladder/placed']),
  ...onEach(ALL, 'no ladder', FLOOR, []),
]);

const DARK = 'surroundings/lightAdequate';
describeRule('surroundings.dark', '1910.333(c)(4)(i), (ii)', [
  ...eachValue(ALL, DARK, [true], []),
  ...eachValue(ALL, DARK, [false], ['stop /surroundings/lightAdequate']),
  ...eachValue(ALL, DARK, [gone, '', 'dim'], ['open /surroundings/lightAdequate']),
]);

const WET = 'surroundings/wet';
describeRule('surroundings.wet', '1910.333(a)(2), 1910.334(a)(4)', [
  ...eachValue(ALL, WET, [false], []),
  ...eachValue(ALL, WET, [true], ['stop /surroundings/wet']),
  ...eachValue(
    ['O'],
    'surroundings/wetMeasures',
    ['Dried, covered, GFCI on the cord'],
    ['caution /surroundings/wet'],
    [],
    { [WET]: true },
  ),
  ...eachValue(['O'], 'surroundings/wetMeasures', ['', '  ', 7], ['stop /surroundings/wet'], [], {
    [WET]: true,
  }),
  ...eachValue(
    ENERGIZED,
    'surroundings/wetMeasures',
    ['Dried, covered, GFCI on the cord'],
    ['stop /surroundings/wet'],
    [],
    { [WET]: true },
  ),
  ...eachValue(ALL, WET, [gone, '', 'damp'], ['open /surroundings/wet']),
]);

const INCHES = 'surroundings/barricadeInches';
const OPEN_TO_PEOPLE: Edits = { 'surroundings/peopleMayApproach': true };
const ATTENDED: Edits = { ...OPEN_TO_PEOPLE, 'surroundings/attendant': true };
describeRule('surroundings.barricade', '1910.335(b)(2), (3)', [
  ...onEach(ALL, 'nobody may approach', {}, []),
  ...eachValue(ALL, 'surroundings/peopleMayApproach', [true, gone, '', 'no'], ['open']),
  ...eachValue(ALL, INCHES, [42, 120], [], [], OPEN_TO_PEOPLE),
  ...eachValue(ALL, INCHES, [41.9, 0], ['stop /surroundings/barricadeInches'], [], OPEN_TO_PEOPLE),
  ...eachValue(ALL, INCHES, [gone, '', NaN, -60], ['open'], [], OPEN_TO_PEOPLE),
  ...onEach(ALL, 'an attendant, no barricade', ATTENDED, []),
  ...onEach(
    ALL,
    'the attendant is refused',
    { ...OPEN_TO_PEOPLE, 'surroundings/attendant': false },
    ['open'],
  ),
  ...eachValue(ALL, INCHES, [41.9], ['stop /surroundings/barricadeInches'], [], ATTENDED),
  ...eachValue(ALL, INCHES, [42], [], [], ATTENDED),
  ...eachValue(ALL, INCHES, [119], ['stop /surroundings/barricadeInches'], [], {
    ...OPEN_TO_PEOPLE,
    'supply/movableConductors': true,
  }),
  ...eachValue(ALL, INCHES, [120], [], [], { ...OPEN_TO_PEOPLE, 'supply/movableConductors': true }),
  ...eachValue(ALL, INCHES, [59], ['stop /surroundings/barricadeInches'], [], {
    ...OPEN_TO_PEOPLE,
    'supply/system': '480Y/277',
    'supply/circuitVolts': 277,
    'supply/readings': gone,
    'supply/conductorColors': gone,
  }),
  ...onEach(
    ALL,
    'the distance is not known yet',
    { ...OPEN_TO_PEOPLE, [INCHES]: 60, 'supply/system': gone },
    ['open'],
    ['*'],
  ),
  ['W', 'below 50 V', { ...BELOW_FIFTY, ...OPEN_TO_PEOPLE }, []],
]);

const OCCUPIED: Edits = { 'job/occupied': true };
describeRule('surroundings.egress-dark', '1910.37(a)(4), (b)(1), (d)(2); NFPA 101 7.9', [
  ['O', 'nobody is in the building', {}, []],
  ['O', 'told and made good', OCCUPIED, ['caution']],
  ...eachValue(['O'], 'job/occupied', [gone, '', 'no'], ['caution']),
  ...eachValue(['O'], 'egress/toldTo', [gone, '', 5], ['open'], [], OCCUPIED),
  ...eachValue(['O'], 'egress/interim', [gone, '', 5], ['open'], [], OCCUPIED),
  ['O', 'neither', { ...OCCUPIED, egress: gone }, ['open', '?open']],
  [
    'O',
    'other equipment only',
    { ...OCCUPIED, egress: gone, egressReaches: 'other equipment only, checked' },
    [],
  ],
  [
    'O',
    'no emergency lighting',
    { ...OCCUPIED, egress: gone, egressSupply: ['none after checking'] },
    [],
  ],
  [
    'O',
    'none, beside a supply: one of them is true',
    { ...OCCUPIED, egress: gone, egressSupply: ['none after checking', 'generator'] },
    ['open', '?open'],
    ['sources.egress-unknown'],
  ],
  [
    'O',
    'nobody knows: that is to be found first',
    { ...OCCUPIED, egress: gone, egressSupply: ['unknown'] },
    [],
    ['sources.egress-unknown'],
  ],
  [
    'O',
    'egressReaches is not answered',
    { ...OCCUPIED, egress: gone, egressReaches: gone },
    ['open', '?open'],
  ],
  ...onEach(ENERGIZED, 'energized', { ...OCCUPIED, egress: gone }, []),
]);

const LIFT: Edits = {
  [ACCESS]: 'lift',
  'surroundings/lift': { fallProtection: true, operatorTrained: true, insulating: true },
};
describeRule('surroundings.lift-unsafe', '1910.67(c)(2)(ii), (v)', [
  ...onEach(ALL, 'sound', LIFT, []),
  ...['fallProtection', 'operatorTrained'].flatMap((key) => [
    ...eachValue(
      ALL,
      `surroundings/lift/${key}`,
      [false],
      [`stop /surroundings/lift/${key}`],
      [],
      LIFT,
    ),
    ...eachValue(
      ALL,
      `surroundings/lift/${key}`,
      [gone, '', 'yes'],
      [`open /surroundings/lift/${key}`],
      [],
      LIFT,
    ),
  ]),
  ...onEach(
    ALL,
    'both',
    {
      ...LIFT,
      'surroundings/lift': { fallProtection: false, operatorTrained: false, insulating: true },
    },
    ['stop', 'stop'],
  ),
  ...onEach(
    ALL,
    'not answered',
    { ...LIFT, 'surroundings/lift': gone },
    ['open', 'open'],
    ['shock.grounded-surface'],
  ),
  ...onEach(ALL, 'no lift', {}, []),
]);

const OUTDOORS = 'surroundings/outdoors';
const LINES = 'surroundings/overheadLines';
describeRule('surroundings.overhead-line', '1910.333(c)(3)(i), (iii)', [
  ...eachValue(ALL, OUTDOORS, [false], []),
  ...eachValue(ALL, OUTDOORS, [gone, '', 'no'], ['open /surroundings/outdoors']),
  ...eachValue(ALL, LINES, ['none within 10 ft'], [], [], { [OUTDOORS]: true }),
  ...eachValue(ALL, LINES, ['nearer than 10 ft'], ['stop /surroundings/overheadLines'], [], {
    [OUTDOORS]: true,
  }),
  ...eachValue(ALL, LINES, [gone, '', 'far'], ['open /surroundings/overheadLines'], [], {
    [OUTDOORS]: true,
  }),
  ...onEach(ALL, 'indoors', { [LINES]: 'nearer than 10 ft' }, []),
]);

const CEILING = 'surroundings/ceiling';
const OPENS = [
  'replace luminaire',
  'replace driver or ballast',
  'replace lamp',
  'replace battery unit',
  'add or extend circuit',
  'work on lighting control',
];
describeRule('surroundings.ceiling-content', '1910.1001(j); 40 CFR 761', [
  ...['O', 'W'].flatMap((base) => eachValue([base as 'O'], CEILING, ['no suspect material'], [])),
  ...JOB_TASKS.flatMap((task) => {
    const opens = OPENS.includes(task);
    const row = (ceiling: unknown, expected: string[]): RuleRow => [
      'O',
      `${task}, ${String(ceiling)}`,
      { 'job/task': task, [CEILING]: ceiling },
      opens ? expected : [],
      ['sources.battery-connected'],
    ];
    return [
      row(gone, ['open /surroundings/ceiling']),
      row('mold', ['open /surroundings/ceiling']),
      row('suspected', ['stop /surroundings/ceiling']),
      row('no suspect material', []),
    ];
  }),
  ...eachValue(['W'], CEILING, [gone, ''], ['open /surroundings/ceiling']),
  ...eachValue(['W'], CEILING, ['suspected'], ['stop /surroundings/ceiling']),
  ...eachValue(['T'], CEILING, [gone, 'suspected'], []),
]);
