import { describe, expect, it } from 'vitest';
import { assessArcFlash } from '@/hazard';
import type { EquipmentLabel } from '@/hazard';
import { evaluateArcFlash } from '@/hazard/arcFlashEvaluation';
import type { ArcFlashQuestion } from '@/hazard/arcFlashEvaluation';
import { arcFlashLikelihood } from '@/hazard/likelihood';

/** A label as it ought to be, but for its rating. */
const printed: EquipmentLabel = {
  ofThisEquipment: true,
  systemVolts: 480,
  reviewedOn: '2025-06-01',
  workingDistanceInches: 18,
  arcFlashBoundaryInches: 48,
};
const work = {
  task: 'energized work',
  condition: 'normal',
  equipment: 'panelboard',
  volts: 480,
  workingDistanceInches: 18,
} as const;
const ask = (label: EquipmentLabel, change: object = {}) =>
  assessArcFlash({ ...work, label: { ...printed, ...label }, ...change });
const boundary = { inches: 48, metres: 48 * 0.0254 };
const noFigures = { ppeCategory: null, requiredArcRatingCalPerCm2: null, arcFlashBoundary: null };

describe('what a label says, NFPA 70E-2024 130.5(H)', () => {
  it.each<[EquipmentLabel, string, number | null, number | null]>([
    [{ incidentEnergyCalPerCm2: 5.4 }, 'incident energy', null, 5.4],
    [{ incidentEnergyCalPerCm2: 12 }, 'incident energy', null, 12],
    [{ incidentEnergyCalPerCm2: 38 }, 'incident energy', null, 38],
    // Table 130.5(G): below 1.2 cal/cm² no arc rating is required.
    [{ incidentEnergyCalPerCm2: 1.2 }, 'incident energy', null, 1.2],
    [{ incidentEnergyCalPerCm2: 1.19 }, 'incident energy', null, null],
    [{ minimumArcRatingCalPerCm2: 8 }, 'incident energy', null, 8],
    [{ minimumArcRatingCalPerCm2: 0.5 }, 'incident energy', null, 0.5],
    // Table 130.7(C)(15)(c).
    [{ ppeCategory: 1 }, 'ppe category', 1, 4],
    [{ ppeCategory: 2 }, 'ppe category', 2, 8],
    [{ ppeCategory: 3 }, 'ppe category', 3, 25],
    [{ ppeCategory: 4 }, 'ppe category', 4, 40],
    // A label ought to bear one rating; the largest of several is required.
    [{ incidentEnergyCalPerCm2: 5.4, minimumArcRatingCalPerCm2: 8 }, 'incident energy', null, 8],
    [{ incidentEnergyCalPerCm2: 9, ppeCategory: 2 }, 'incident energy', null, 9],
    [{ incidentEnergyCalPerCm2: 1, ppeCategory: 2 }, 'incident energy', null, 8],
  ])('%j', (label, method, ppeCategory, requiredArcRatingCalPerCm2) => {
    expect(ask(label)).toMatchObject({
      likely: true,
      method,
      ppeCategory,
      requiredArcRatingCalPerCm2,
      arcFlashBoundary: boundary,
      findings: [],
    });
  });

  it('cites the label, and the ratings only for a category', () => {
    const tables = (label: EquipmentLabel) => ask(label).citations.map(({ table }) => table);
    expect(tables({ ppeCategory: 2 })).toEqual([
      'Table 130.5(C)',
      '130.5(H)',
      'Table 130.7(C)(15)(c)',
    ]);
    expect(tables({ incidentEnergyCalPerCm2: 2 })).toEqual(['Table 130.5(C)', '130.5(H)']);
  });

  it('counts as this equipment’s when it does not say', () => {
    expect(ask({ ofThisEquipment: undefined, ppeCategory: 2 }).method).toBe('ppe category');
    const { arcFlashBoundary } = ask({ ofThisEquipment: undefined, ppeCategory: 2 });
    expect(arcFlashBoundary).toEqual(boundary);
  });

  it('governs beside limits of the table, above its voltages as below', () => {
    const limits = { availableFaultKiloamperes: 10, clearingSeconds: 0.03 };
    expect(ask({ ppeCategory: 4 }, limits).requiredArcRatingCalPerCm2).toBe(40);
    expect(ask({ ppeCategory: 4, systemVolts: 4160 }, { volts: 4160 }).ppeCategory).toBe(4);
  });

  it('of other equipment counts as none', () => {
    const limits = { availableFaultKiloamperes: 10, clearingSeconds: 0.03 };
    const other = { ofThisEquipment: false, incidentEnergyCalPerCm2: 50 };
    expect(ask(other, limits)).toMatchObject({ ppeCategory: 2, findings: [] });
    expect(ask(other).findings.map(({ severity }) => severity)).toEqual(['open', 'open']);
    expect(assessArcFlash({ ...work, ...limits, label: null }).ppeCategory).toBe(2);
  });

  it('gives no figure where an arc flash is not likely', () => {
    expect(ask({ ppeCategory: 2 }, { task: 'read panel meter' })).toMatchObject({
      likely: false,
      method: 'not likely',
      ...noFigures,
      findings: [],
    });
  });
});

describe('a label that does not hold', () => {
  it('for another voltage is a stop', () => {
    const answer = ask({ ppeCategory: 2, systemVolts: 208 });
    expect(answer).toMatchObject({ method: 'study needed', ...noFigures });
    expect(answer.findings).toMatchObject([
      {
        code: 'arc.study-needed',
        severity: 'stop',
        path: '/arcFlash/label/systemVolts',
        params: { limit: 'label-voltage-differs', value: 208, allowed: 480 },
      },
    ]);
  });

  it('for a longer working distance is a stop', () => {
    const answer = ask({ incidentEnergyCalPerCm2: 4 }, { workingDistanceInches: 17.9 });
    expect(answer).toMatchObject({ method: 'study needed', ...noFigures });
    expect(answer.findings).toMatchObject([
      {
        severity: 'stop',
        path: '/arcFlash/workingDistanceInches',
        params: { limit: 'label-working-distance', value: 17.9, allowed: 18 },
      },
    ]);
  });

  it.each<[string, EquipmentLabel]>([
    ['/arcFlash/label', {}],
    ['/arcFlash/label', { incidentEnergyCalPerCm2: 0 }],
    ['/arcFlash/label/systemVolts', { ppeCategory: 2, systemVolts: undefined }],
    ['/arcFlash/label/systemVolts', { ppeCategory: 2, systemVolts: 0 }],
    [
      '/arcFlash/label/arcFlashBoundaryInches',
      { ppeCategory: 2, arcFlashBoundaryInches: undefined },
    ],
    [
      '/arcFlash/label/workingDistanceInches',
      { incidentEnergyCalPerCm2: 4, workingDistanceInches: undefined },
    ],
  ])('is open at %s while it is not read', (path, label) => {
    const answer = ask(label);
    expect(answer).toMatchObject({ method: 'study needed', ...noFigures });
    expect(answer.findings).toMatchObject([
      { code: 'arc.study-needed', severity: 'open', path, params: { limit: 'not-answered' } },
    ]);
  });

  it('without a date of review is a caution, which leaves the figures', () => {
    const answer = ask({ ppeCategory: 2, reviewedOn: undefined });
    expect(answer).toMatchObject({ method: 'ppe category', findings: [{ severity: 'caution' }] });
    // Without a day its age is not judged.
    expect(ask({ ppeCategory: 2, reviewedOn: '1990-01-01' }).findings).toEqual([]);
  });

  it('needs no working distance of its own for a category or a printed rating', () => {
    const label = { workingDistanceInches: undefined };
    expect(ask({ ...label, ppeCategory: 2 }).findings).toEqual([]);
    expect(ask({ ...label, minimumArcRatingCalPerCm2: 8 }).findings).toEqual([]);
  });
});

describe('above 40 cal/cm², own policy', () => {
  it.each([
    ['incidentEnergyCalPerCm2', 40, 0],
    ['incidentEnergyCalPerCm2', 40.1, 1],
    ['minimumArcRatingCalPerCm2', 40, 0],
    ['minimumArcRatingCalPerCm2', 40.1, 1],
  ] as const)('%s of %d: %d stop', (name, energy, count) => {
    for (const task of ['energized work', 'read panel meter'] as const) {
      const { findings } = ask({ [name]: energy }, { task });
      expect(findings).toHaveLength(count);
      if (count === 0) continue;
      expect(findings).toMatchObject([
        {
          code: 'arc.above-forty',
          severity: 'stop',
          path: `/arcFlash/label/${name}`,
          params: { energy, allowed: 40 },
          citation: { confidence: 'own policy' },
        },
      ]);
    }
  });

  it('says nothing of a category', () => {
    expect(ask({ ppeCategory: 4 }).findings).toEqual([]);
  });
});

describe('the review of a label, every five years (from memory)', () => {
  const review = (reviewedOn: string | undefined, day: string | undefined) =>
    evaluateArcFlash({
      ...work,
      likelihood: arcFlashLikelihood(work),
      label: { ...printed, ppeCategory: 2, reviewedOn },
      day,
    });

  it.each([
    ['2021-12-01', '2026-12-01', 0],
    ['2021-11-30', '2026-12-01', 1],
    ['2024-02-29', '2029-02-28', 0],
    ['2024-02-29', '2029-03-01', 1],
    ['2026-12-02', '2026-12-01', 1],
    ['2026-12-01', '2026-12-01', 0],
    [undefined, '2026-12-01', 1],
    ['2026-02-30', '2026-12-01', 1],
    ['1990-01-01', undefined, 0],
    [undefined, undefined, 1],
  ])('reviewed on %s, day %s: %d caution', (reviewedOn, day, count) => {
    const answer = review(reviewedOn, day);
    expect(answer.findings).toHaveLength(count);
    // A caution leaves the figures as they are.
    expect(answer).toMatchObject({ method: 'ppe category', ppeCategory: 2 });
    if (count === 0) return;
    expect(answer.findings).toMatchObject([
      {
        code: 'arc.study-needed',
        severity: 'caution',
        path: '/arcFlash/label/reviewedOn',
        params: { limit: 'label-review', years: 5 },
        citation: { confidence: 'memory' },
      },
    ]);
  });
});

describe('what is not answered yet', () => {
  const inside: ArcFlashQuestion = {
    ...work,
    likelihood: arcFlashLikelihood(work),
    noLabel: true,
    availableFaultKiloamperes: 10,
    clearingSeconds: 0.03,
  };
  const evaluate = (change: Partial<ArcFlashQuestion>) => {
    const { method, findings } = evaluateArcFlash({ ...inside, ...change });
    return {
      method,
      findings: findings.map(({ path, severity, params }) => `${severity} ${path} ${params.limit}`),
    };
  };

  it('is open while it is not said whether there is a label', () => {
    for (const noLabel of [undefined, false]) {
      expect(evaluate({ noLabel })).toEqual({
        method: 'study needed',
        findings: ['open /arcFlash/label label-not-answered'],
      });
    }
    expect(evaluate({ noLabel: undefined, workingDistanceInches: undefined }).findings).toEqual([
      'open /arcFlash/label label-not-answered',
      'open /arcFlash/workingDistanceInches not-answered',
    ]);
  });

  it('is left to the caller where the equipment or the voltage is missing', () => {
    expect(evaluate({ equipment: undefined })).toEqual({ method: 'study needed', findings: [] });
    expect(evaluate({ volts: undefined, clearingSeconds: undefined }).findings).toEqual([
      'open /arcFlash/clearingSeconds not-answered',
    ]);
    expect(evaluate({ equipment: undefined, limitsNotKnown: true }).findings).toEqual([
      'stop /arcFlash/limitsNotKnown limits-not-known',
    ]);
  });

  it('is a stop where the limits cannot be known, also beside known ones', () => {
    const stop = 'stop /arcFlash/limitsNotKnown limits-not-known';
    expect(evaluate({ limitsNotKnown: true })).toEqual({
      method: 'study needed',
      findings: [stop],
    });
    const unknown = { availableFaultKiloamperes: undefined, clearingSeconds: undefined };
    expect(evaluate({ limitsNotKnown: true, ...unknown }).findings).toEqual([stop]);
    expect(
      evaluate({ limitsNotKnown: true, ...unknown, workingDistanceInches: undefined }).findings,
    ).toEqual([stop, 'open /arcFlash/workingDistanceInches not-answered']);
  });

  it('lets a label govern beside noLabel and limits that are not known', () => {
    const label = { ...printed, ppeCategory: 2 };
    expect(evaluate({ label, limitsNotKnown: true })).toEqual({
      method: 'ppe category',
      findings: [],
    });
    expect(evaluate({ label, volts: undefined }).findings).toEqual([]);
    expect(evaluate({ label, workingDistanceInches: undefined }).findings).toEqual([
      'open /arcFlash/workingDistanceInches not-answered',
    ]);
  });

  it('takes no category that a label cannot bear', () => {
    expect(evaluate({ label: { ...printed, ppeCategory: 5 } }).findings).toEqual([
      'open /arcFlash/label not-answered',
    ]);
  });

  it('takes the table for a label of other equipment', () => {
    const label = { ...printed, ofThisEquipment: false };
    expect(evaluate({ label, noLabel: undefined }).method).toBe('ppe category');
  });
});

describe('a transformer estimate', () => {
  const evaluate = (estimate: number, change: Partial<ArcFlashQuestion> = {}) =>
    evaluateArcFlash({
      ...work,
      likelihood: arcFlashLikelihood(work),
      noLabel: true,
      clearingSeconds: 0.03,
      transformerKiloamperes: estimate,
      ...change,
    });
  const severities = (answer: ReturnType<typeof evaluate>) =>
    answer.findings.map(({ severity, path }) => `${severity} ${path}`);
  const caution = 'caution /arcFlash/transformer';
  const stop = 'stop /arcFlash/transformer';

  it.each([
    [22.4, []],
    [22.5, [caution]],
    [25, [caution]],
    [25.1, [stop, caution]],
    [27.5, [stop, caution]],
    [27.6, [stop]],
  ])('of %d kA at a limit of 25 kA', (estimate, expected) => {
    expect(severities(evaluate(estimate))).toEqual(expected);
  });

  it('gives way to a fault current that is given and as large', () => {
    const given = { availableFaultKiloamperes: 30 };
    expect(severities(evaluate(30, given))).toEqual(['stop /arcFlash/availableFaultKiloamperes']);
    expect(severities(evaluate(30.1, given))).toEqual([stop]);
  });

  it('gives both figures with the caution, and keeps the category', () => {
    const answer = evaluate(24);
    expect(answer.ppeCategory).toBe(2);
    expect(answer.findings[0]?.params).toEqual({
      limit: 'transformer-near-limit',
      estimate: 24,
      limitKiloamperes: 25,
    });
  });

  it('counts beside a given figure as the larger of the two', () => {
    expect(severities(evaluate(40, { availableFaultKiloamperes: 10 }))).toEqual([stop]);
    expect(severities(evaluate(10, { availableFaultKiloamperes: 40 }))).toEqual([
      'stop /arcFlash/availableFaultKiloamperes',
    ]);
    expect(severities(evaluate(24, { availableFaultKiloamperes: 10 }))).toEqual([caution]);
  });

  it('is held beside both limits of a motor control center', () => {
    const center = { equipment: 'motor control center' } as const;
    expect(severities(evaluate(46.2, center))).toEqual([caution]);
    expect(severities(evaluate(46.3, center))).toEqual([]);
    expect(severities(evaluate(60, center))).toEqual([caution]);
  });
});

describe('arguments of a label', () => {
  it.each([
    'systemVolts',
    'incidentEnergyCalPerCm2',
    'workingDistanceInches',
    'minimumArcRatingCalPerCm2',
    'arcFlashBoundaryInches',
  ] as const)('refuses bad figures for %s by name', (name) => {
    for (const bad of [NaN, Infinity, -1]) {
      expect(() => ask({ [name]: bad })).toThrow(RangeError);
      expect(() => ask({ [name]: bad })).toThrow(new RegExp(`^label.${name}`));
    }
  });

  it('refuses other answers that a label cannot give', () => {
    expect(() => ask({ ppeCategory: 0 })).toThrow(/^label.ppeCategory/);
    expect(() => ask({ ppeCategory: 2.5 })).toThrow(RangeError);
    expect(() => ask({ reviewedOn: 'last year' })).toThrow(/^label.reviewedOn/);
    expect(() => ask({ ofThisEquipment: 'no' as unknown as boolean })).toThrow(
      /^label.ofThisEquipment/,
    );
    expect(() => assessArcFlash({ ...work, label: 'none' as EquipmentLabel })).toThrow(/^label/);
  });
});
