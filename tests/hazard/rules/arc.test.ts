import { describe, expect, it } from 'vitest';
import { BELOW_FIFTY, CIRCUIT_277, FAR } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import {
  ALL,
  assessBase,
  describeRule,
  eachValue,
  ENERGIZED,
  gone,
  onEach,
} from '../../support/ruleTable';

const LABEL = {
  ofThisEquipment: true,
  systemVolts: 208,
  reviewedOn: '2025-01-01',
  incidentEnergyCalPerCm2: 3,
  workingDistanceInches: 18,
  arcFlashBoundaryInches: 30,
};
const { incidentEnergyCalPerCm2: _energy, workingDistanceInches: _distance, ...PRINTED } = LABEL;
const labelled = (label: object, others: Edits = {}): Edits => ({
  'arcFlash/noLabel': false,
  'arcFlash/label': label,
  'arcFlash/clothingRatingCalPerCm2': 40,
  ...others,
});

const LIMITS: [string, string, unknown[], unknown[]][] = [
  ['arcFlash/availableFaultKiloamperes', '25 kA', [0.1, 25], [25.1, 65]],
  ['arcFlash/clearingSeconds', '0.03 s', [0.01, 0.03], [0.031, 2]],
  ['arcFlash/workingDistanceInches', '18 in', [18, 36], [17.9, 0]],
];

describeRule('arc.study-needed', '70E 130.5, table 130.7(C)(15)(a)', [
  ...LIMITS.flatMap(([pointer, , inside, outside]) => [
    ...eachValue(ALL, pointer, inside, []),
    ...eachValue(ALL, pointer, outside, ['stop'], ['arc.rating-low']),
    ...eachValue(ALL, pointer, [gone, '', NaN, -1, Infinity], ['open'], ['arc.rating-low']),
  ]),
  ...['availableFaultKiloamperes', 'clearingSeconds'].flatMap((key) =>
    eachValue(ALL, `arcFlash/${key}`, [0], ['open'], ['arc.rating-low']),
  ),
  ...onEach(
    ALL,
    'limits not known',
    { 'arcFlash/limitsNotKnown': true },
    ['stop'],
    ['arc.rating-low'],
  ),
  ...onEach(
    ALL,
    'limits not known, none given',
    {
      'arcFlash/limitsNotKnown': true,
      'arcFlash/clearingSeconds': gone,
      'arcFlash/availableFaultKiloamperes': gone,
    },
    ['stop', '?open'],
    ['arc.rating-low'],
  ),
  ...eachValue(ALL, 'arcFlash/noLabel', [gone, false, 'yes'], ['open'], ['arc.rating-low']),
  ...onEach(ALL, 'a label with energy', labelled(LABEL), []),
  ...onEach(ALL, 'a label beside no label', labelled(LABEL, { 'arcFlash/noLabel': true }), []),
  ...onEach(
    ALL,
    'a label governs where the table would not hold',
    labelled(LABEL, {
      'arcFlash/noLabel': true,
      'arcFlash/availableFaultKiloamperes': 60,
      'arcFlash/limitsNotKnown': true,
    }),
    [],
  ),
  ...onEach(
    ALL,
    "another equipment's label, limits known",
    labelled({ ...LABEL, ofThisEquipment: false }),
    [],
  ),
  ...onEach(
    ALL,
    "another equipment's label, limit exceeded",
    labelled({ ...LABEL, ofThisEquipment: false }, { 'arcFlash/clearingSeconds': 1 }),
    ['stop'],
    ['arc.rating-low'],
  ),
  ...onEach(
    ALL,
    "another equipment's label, limit not answered",
    labelled({ ...LABEL, ofThisEquipment: false }, { 'arcFlash/clearingSeconds': gone }),
    ['open'],
    ['arc.rating-low'],
  ),
  ...eachValue(ALL, 'arcFlash/label/ofThisEquipment', [gone], [], [], labelled(LABEL)),
  ...eachValue(
    ALL,
    'arcFlash/label/systemVolts',
    [120, 240, 480],
    ['stop'],
    ['arc.rating-low'],
    labelled(LABEL),
  ),
  ...eachValue(
    ALL,
    'arcFlash/label/systemVolts',
    [gone, 0, 'x', NaN],
    ['open'],
    ['arc.rating-low'],
    labelled(LABEL),
  ),
  ...eachValue(ALL, 'arcFlash/workingDistanceInches', [18, 24], [], [], labelled(LABEL)),
  ...eachValue(
    ALL,
    'arcFlash/workingDistanceInches',
    [17.9],
    ['stop'],
    ['arc.rating-low'],
    labelled(LABEL),
  ),
  ...eachValue(
    ALL,
    'arcFlash/workingDistanceInches',
    [gone],
    ['open'],
    ['arc.rating-low'],
    labelled(LABEL),
  ),
  ...eachValue(
    ALL,
    'arcFlash/label/workingDistanceInches',
    [gone, 0, ''],
    ['open'],
    ['arc.rating-low'],
    labelled(LABEL),
  ),
  ...onEach(
    ALL,
    'a label with a minimum rating',
    labelled({ ...PRINTED, minimumArcRatingCalPerCm2: 8 }),
    [],
  ),
  ...onEach(ALL, 'a label with a category', labelled({ ...PRINTED, ppeCategory: 2 }), []),
  ...onEach(ALL, 'a label without a rating', labelled(PRINTED), ['open'], ['arc.rating-low']),
  ...eachValue(
    ALL,
    'arcFlash/label/arcFlashBoundaryInches',
    [gone, 0],
    ['open'],
    ['*'],
    labelled(LABEL),
  ),
  ...onEach(ALL, 'reviewed five years ago', labelled({ ...LABEL, reviewedOn: '2021-12-01' }), []),
  ...onEach(
    ALL,
    'reviewed more than five years ago',
    labelled({ ...LABEL, reviewedOn: '2021-11-30' }),
    ['caution'],
  ),
  ...eachValue(
    ALL,
    'arcFlash/label/reviewedOn',
    [gone, '', 'long ago'],
    ['caution'],
    [],
    labelled(LABEL),
  ),
  ...onEach(
    ALL,
    'a switchboard asks 24 in',
    {
      'arcFlash/equipment': 'switchboard',
      'supply/atService': false,
      'arcFlash/clothingRatingCalPerCm2': 40,
    },
    ['stop'],
  ),
  ...onEach(
    ALL,
    'a motor control center within its second row',
    {
      'arcFlash/equipment': 'motor control center',
      'arcFlash/availableFaultKiloamperes': 42,
      'arcFlash/clearingSeconds': 0.33,
      'arcFlash/clothingRatingCalPerCm2': 40,
    },
    [],
  ),
  ...onEach(
    ['T'],
    'not likely',
    { ...FAR, 'arcFlash/limitsNotKnown': true, 'arcFlash/noLabel': gone },
    [],
  ),
  ...onEach(
    ['W'],
    'below 50 V',
    { ...BELOW_FIFTY, 'arcFlash/limitsNotKnown': true, 'arcFlash/noLabel': gone },
    [],
  ),
]);

/** kVA at 208 V and 2 % whose infinite bus gives so many kiloamperes. */
const transformer = (kiloamperes: number) => ({
  kilovoltAmperes: (kiloamperes * Math.sqrt(3) * 208 * 2) / 100,
  secondaryVolts: 208,
  impedancePercent: 2,
  phases: 3,
});
const fed = (kiloamperes: number, known: unknown = gone): Edits => ({
  'arcFlash/availableFaultKiloamperes': known,
  'arcFlash/transformer': transformer(kiloamperes),
});
describeRule('arc.study-needed', 'transformer estimate, 70E 130.5', [
  ...onEach(ALL, 'well within', fed(10), []),
  ...onEach(ALL, 'just outside 10 %', fed(22.4), []),
  ...onEach(ALL, 'within 10 %, below', fed(22.6), ['caution /arcFlash/transformer']),
  ...onEach(ALL, 'within 10 %, below, a smaller figure known', fed(24, 8), [
    'caution /arcFlash/transformer',
  ]),
  ...onEach(ALL, 'far above', fed(40), ['stop'], ['arc.rating-low']),
  ...onEach(ALL, 'far above, a smaller figure known', fed(40, 8), ['stop'], ['arc.rating-low']),
  ...onEach(ALL, 'within, a larger figure known', fed(10, 30), ['stop'], ['arc.rating-low']),
  ...onEach(
    ALL,
    'within 10 %, above',
    fed(26),
    ['?caution /arcFlash/transformer', 'stop', '?caution /arcFlash/transformer'],
    ['arc.rating-low'],
  ),
  ...['kilovoltAmperes', 'secondaryVolts', 'impedancePercent', 'phases'].flatMap((key) =>
    eachValue(
      ['O'],
      `arcFlash/transformer/${key}`,
      [gone, 'x', -1, NaN],
      ['open', '?open'],
      ['arc.rating-low'],
      fed(10),
    ),
  ),
  ...eachValue(
    ['O'],
    'arcFlash/transformer/impedancePercent',
    [0],
    ['open', '?open'],
    ['arc.rating-low'],
    fed(10),
  ),
]);

describe('arc.study-needed names both figures of a near transformer estimate', () => {
  it('gives the estimate and the limit', () => {
    const near = assessBase('O', fed(24)).findings.find(
      ({ path }) => path === '/arcFlash/transformer',
    );
    const figures = Object.values(near?.params ?? {}).map(Number);
    expect(
      figures.some((figure) => Math.abs(figure - 24) < 0.1 || Math.abs(figure - 24_000) < 100),
    ).toBe(true);
    expect(figures.some((figure) => figure === 25 || figure === 25_000)).toBe(true);
  });
});

const HALF_READ: Edits = { 'arcFlash/transformer': { kilovoltAmperes: 75 } };
const GAPS = ['secondaryVolts', 'impedancePercent', 'phases'].map(
  (name) => `open /arcFlash/transformer/${name}`,
);
describeRule('arc.study-needed', 'a nameplate read by half (own policy)', [
  ...onEach(['O'], 'beside a fault current', HALF_READ, GAPS),
  ...onEach(['O'], 'beside the label of this equipment', labelled(LABEL, HALF_READ), []),
  ...onEach(
    ['O'],
    'beside the label of other equipment',
    labelled({ ...LABEL, ofThisEquipment: false }, HALF_READ),
    GAPS,
    ['*'],
  ),
  ...onEach(
    ['O'],
    'without a fault current, which alone is asked for',
    { ...HALF_READ, 'arcFlash/availableFaultKiloamperes': gone },
    ['open /arcFlash/availableFaultKiloamperes'],
    ['arc.rating-low'],
  ),
  ...onEach(['T'], 'where nothing is likely', { ...FAR, ...HALF_READ }, []),
  ...onEach(['W'], 'below 50 V', { ...BELOW_FIFTY, ...HALF_READ }, []),
]);

describe('the estimate from a nameplate (I = S / (√3 V Z), an infinite bus)', () => {
  it('is 30.0703 kA for 500 kVA, 480 V, 2 %, three phases', () => {
    const nameplate = { kilovoltAmperes: 500, secondaryVolts: 480, impedancePercent: 2, phases: 3 };
    const over = assessBase('O', { ...fed(10), 'arcFlash/transformer': nameplate });
    const stop = over.findings.find(
      ({ path, severity }) => path === '/arcFlash/transformer' && severity === 'stop',
    );
    expect(stop?.params['value']).toBeCloseTo(30.0703, 3);
    expect(stop?.params['allowed']).toBe(25);
  });
});

describe('the findings of the arc flash assessment', () => {
  it('are those of the worksheet that begin with arc.', () => {
    const { arcFlash, findings } = assessBase('O', fed(40));
    expect(arcFlash.findings.length).toBeGreaterThan(0);
    expect(arcFlash.findings).toEqual(findings.filter(({ code }) => /^arc\./.test(code)));
  });
});

describeRule('arc.above-forty', 'own policy', [
  ...onEach(ALL, '40 cal/cm²', labelled({ ...LABEL, incidentEnergyCalPerCm2: 40 }), []),
  ...onEach(
    ALL,
    '40.1 cal/cm²',
    labelled(
      { ...LABEL, incidentEnergyCalPerCm2: 40.1 },
      { 'arcFlash/clothingRatingCalPerCm2': 100 },
    ),
    ['stop /arcFlash/label*'],
  ),
  ...onEach(
    ALL,
    'a printed rating',
    labelled(
      { ...PRINTED, minimumArcRatingCalPerCm2: 41 },
      { 'arcFlash/clothingRatingCalPerCm2': 100 },
    ),
    ['stop /arcFlash/label*'],
  ),
  ...onEach(
    ALL,
    "another equipment's",
    labelled({ ...LABEL, ofThisEquipment: false, incidentEnergyCalPerCm2: 50 }),
    [],
  ),
  [
    'T',
    'not likely',
    { ...FAR, ...labelled({ ...LABEL, incidentEnergyCalPerCm2: 50 }) },
    ['stop /arcFlash/label*'],
  ],
  [
    'W',
    'below 50 V',
    { ...BELOW_FIFTY, ...labelled({ ...LABEL, incidentEnergyCalPerCm2: 50 }) },
    [],
  ],
]);

const CLOTHING = 'arcFlash/clothingRatingCalPerCm2';
describeRule('arc.rating-low', '70E 130.5(G), 130.7(C)(15)(c)', [
  ...eachValue(ALL, CLOTHING, [4, 40], []),
  ...eachValue(ALL, CLOTHING, [3.9, 0], ['stop /arcFlash/clothingRatingCalPerCm2']),
  ...eachValue(ALL, CLOTHING, [gone, '', NaN, -8], ['open /arcFlash/clothingRatingCalPerCm2']),
  ...eachValue(ALL, CLOTHING, [8], [], [], CIRCUIT_277),
  ...eachValue(ALL, CLOTHING, [7.9], ['stop /arcFlash/clothingRatingCalPerCm2'], [], CIRCUIT_277),
  ...onEach(ALL, 'the energy of the label', labelled(LABEL, { [CLOTHING]: 3 }), []),
  ...onEach(ALL, 'below the energy of the label', labelled(LABEL, { [CLOTHING]: 2.9 }), [
    'stop /arcFlash/clothingRatingCalPerCm2',
  ]),
  ...onEach(
    ALL,
    'energy below 1.2',
    labelled({ ...LABEL, incidentEnergyCalPerCm2: 1.1 }, { [CLOTHING]: gone }),
    [],
  ),
  ...onEach(
    ALL,
    'energy of 1.2',
    labelled({ ...LABEL, incidentEnergyCalPerCm2: 1.2 }, { [CLOTHING]: gone }),
    ['open'],
  ),
  ...[
    [1, 4],
    [2, 8],
    [3, 25],
    [4, 40],
  ].flatMap(([ppeCategory, rating]) => [
    ...eachValue(['O'], CLOTHING, [rating], [], [], {
      ...labelled({ ...PRINTED, ppeCategory }),
      [CLOTHING]: gone,
    }),
    ...eachValue(['O'], CLOTHING, [(rating ?? 0) - 0.1], ['stop'], [], {
      ...labelled({ ...PRINTED, ppeCategory }),
      [CLOTHING]: gone,
    }),
  ]),
  ...onEach(
    ALL,
    'the printed rating',
    labelled({ ...PRINTED, minimumArcRatingCalPerCm2: 9 }, { [CLOTHING]: 8.9 }),
    ['stop'],
  ),
  ['T', 'not likely', { ...FAR, [CLOTHING]: gone }, []],
  ['W', 'below 50 V', { ...BELOW_FIFTY, [CLOTHING]: gone }, []],
]);

const TASK = 'arcFlash/task';
const NEVER_LIKELY = [
  'read panel meter',
  'control circuit up to 125 V',
  'thermography or inspection outside restricted',
];
const NORMALLY_NOT = ['operate device', 'open dead-front door', 'cover without exposed parts'];
const LIKELY = [
  'remove or install breaker',
  'voltage test',
  'remove cover exposing parts',
  'energized work on equipment fed from panelboard',
  'energized work',
  'temporary grounds',
];
const EXPOSED = 'supply/higherVoltsExposed';
/** Work on lighting control that is below 50 V, justified for another reason. */
const CONTROL: Edits = {
  'job/task': 'work on lighting control',
  'supply/workVolts': 24,
  [EXPOSED]: false,
  [TASK]: 'operate device',
};
const OPEN = ['open /arcFlash/task'];
describeRule('arc.task-does-not-fit', '70E Table 130.5(C)', [
  ...eachValue(ENERGIZED, TASK, LIKELY, []),
  ...eachValue(ENERGIZED, TASK, [...NORMALLY_NOT, ...NEVER_LIKELY], ['open /arcFlash/task']),
  ...eachValue(['O'], TASK, [gone, ...LIKELY, ...NORMALLY_NOT, ...NEVER_LIKELY], []),
  ...eachValue(ENERGIZED, TASK, NEVER_LIKELY, ['open /arcFlash/task'], [], {
    'arcFlash/normal/maintained': false,
  }),
  ['T', 'an inspection as chosen', { ...FAR, [TASK]: 'operate device' }, []],
  [
    'T',
    'a control circuit, its voltage not answered',
    { ...FAR, [TASK]: 'control circuit up to 125 V' },
    ['open /arcFlash/task'],
  ],
  [
    'T',
    'a control circuit of 125 V',
    {
      ...FAR,
      [TASK]: 'control circuit up to 125 V',
      'supply/workVolts': 125,
      'supply/higherVoltsExposed': false,
    },
    [],
  ],
  [
    'T',
    'a control circuit of 126 V',
    {
      ...FAR,
      [TASK]: 'control circuit up to 125 V',
      'supply/workVolts': 126,
      'supply/higherVoltsExposed': false,
    },
    ['open /arcFlash/task'],
  ],
  [
    'T',
    'a control circuit, higher exposed',
    {
      ...FAR,
      [TASK]: 'control circuit up to 125 V',
      'supply/workVolts': 24,
      'supply/higherVoltsExposed': true,
    },
    ['open /arcFlash/task'],
  ],
  ['T', 'an inspection from outside', FAR, []],
  ...eachValue(['T'], 'arcFlash/normal/coversOn', [false, gone], ['open /arcFlash/task'], [], FAR),
  [
    'T',
    'an inspection with someone restricted',
    { ...FAR, 'crew/0/closest': 'restricted' },
    ['open /arcFlash/task'],
  ],
  [
    'T',
    'tracing with nobody restricted',
    { ...FAR, 'job/task': 'trace circuit', [TASK]: 'operate device', 'absenceTest/byCrewId': 'c1' },
    [],
  ],
  [
    'T',
    'tracing with someone restricted',
    { 'job/task': 'trace circuit', [TASK]: 'operate device' },
    ['open /arcFlash/task'],
  ],
  [
    'T',
    'tracing with nobody restricted, a cover off',
    {
      ...FAR,
      'job/task': 'trace circuit',
      [TASK]: 'operate device',
      'arcFlash/normal/coversOn': false,
      'arcFlash/normal/maintained': true,
    },
    [],
  ],
  ['W', 'below 50 V', { ...BELOW_FIFTY, [TASK]: 'operate device' }, []],
  ['W', 'lighting control at line voltage', { ...CONTROL, 'supply/workVolts': 120 }, OPEN],
  ['W', 'lighting control at 24 V, higher exposed', { ...CONTROL, [EXPOSED]: true }, OPEN],
  ['W', 'lighting control at 24 V, nothing higher exposed', CONTROL, []],
]);

const CLOSEST = 'crew/1/closest';
const WIDE: Edits = labelled({ ...LABEL, arcFlashBoundaryInches: 60 });
describeRule('arc.bystander-inside', '70E 130.5, 130.7', [
  ...onEach(ALL, 'outside all boundaries', {}, []),
  ...eachValue(ALL, CLOSEST, ['outside limited'], []),
  ...eachValue(
    ALL,
    CLOSEST,
    ['limited', 'limited with escort', 'restricted'],
    ['stop /crew/1*'],
    ['shock.*', 'crew.*'],
  ),
  ...eachValue(
    ALL,
    CLOSEST,
    ['limited', 'limited with escort', 'restricted', 'outside limited'],
    [],
    ['shock.*', 'crew.*'],
    { 'crew/1/arcRated': true },
  ),
  ...eachValue(
    ALL,
    'crew/1/arcRated',
    [false, gone, 'yes'],
    ['stop /crew/1*'],
    ['shock.escort-is-working'],
    { [CLOSEST]: 'limited with escort' },
  ),
  ...eachValue(ALL, CLOSEST, ['outside limited'], ['stop /crew/1*'], [], WIDE),
  ...eachValue(ALL, CLOSEST, ['outside limited'], [], [], {
    ...WIDE,
    'supply/movableConductors': true,
  }),
  ...eachValue(ALL, CLOSEST, ['outside limited'], ['stop /crew/1*'], [], CIRCUIT_277),
  ...eachValue(ALL, CLOSEST, ['outside all boundaries'], [], [], WIDE),
  ...onEach(ALL, 'the lead himself', { 'crew/0/arcRated': false }, ['stop /crew/0*']),
  ...onEach(
    ALL,
    'nothing is required',
    labelled({ ...LABEL, incidentEnergyCalPerCm2: 1 }, { 'crew/0/arcRated': false }),
    [],
  ),
  ['T', 'not likely', { ...FAR, 'crew/0/arcRated': false, 'crew/0/closest': 'limited' }, []],
  [
    'O',
    'who tests counts as restricted',
    { 'crew/0/closest': 'outside all boundaries', 'crew/0/arcRated': false },
    ['stop /crew/0*'],
  ],
]);
