import { describe, expect, it } from 'vitest';
import { assess } from '@/hazard';
import { BELOW_FIFTY, CIRCUIT_277 } from '../../support/ruleEdits';
import type { Edits } from '../../support/ruleTable';
import { assessBase, found, gone } from '../../support/ruleTable';
import { soundWorksheet } from '../../support/soundWorksheet';

const labelled = (label: object): Edits => ({
  'arcFlash/noLabel': gone,
  'arcFlash/clothingRatingCalPerCm2': 40,
  'arcFlash/label': {
    ofThisEquipment: true,
    systemVolts: 208,
    reviewedOn: '2025-01-01',
    incidentEnergyCalPerCm2: 3,
    workingDistanceInches: 18,
    ...label,
  },
});

describe('the barricade (29 CFR 1910.335(b); the larger of the two boundaries)', () => {
  it('names what it rests on', () => {
    const { barricade } = assessBase('O');
    expect(barricade).toMatchObject({ inches: 42, citation: { standard: 'NFPA 70E' } });
  });

  it('stays open while the arc flash boundary is not known', () => {
    const edits = {
      'surroundings/peopleMayApproach': true,
      'surroundings/barricadeInches': 60,
      'arcFlash/availableFaultKiloamperes': 60,
    };
    expect(found(assessBase('O', edits), 'surroundings.barricade')).toEqual([
      'open /surroundings/barricadeInches',
    ]);
  });
});

describe('who stands beyond the limited boundary of 42 in', () => {
  const bystander = { 'crew/1/closest': 'outside limited', 'crew/1/arcRated': false };
  it.each([
    ['is outside an arc flash boundary as far away', 42, []],
    ['is inside one that lies farther out', 42.5, ['stop /crew/1/arcRated']],
  ])('%s', (_, arcFlashBoundaryInches, expected) => {
    const edits = { ...labelled({ arcFlashBoundaryInches }), ...bystander };
    expect(found(assessBase('O', edits), 'arc.bystander-inside')).toEqual(expected);
  });

  it('may be inside while the system is not answered', () => {
    const edits = {
      ...labelled({ arcFlashBoundaryInches: 19 }),
      ...bystander,
      'supply/system': gone,
    };
    expect(found(assessBase('O', edits), 'arc.bystander-inside')).not.toEqual([]);
  });
});

describe('the current of a touch (IEC 60479-1 body impedances, from 100 V to 1000 V)', () => {
  it.each([
    ['1000 V', 'O', { 'supply/circuitVolts': 1000 }, 1000],
    ['1001 V', 'O', { 'supply/circuitVolts': 1001 }, undefined],
    ['49 V', 'W', { ...BELOW_FIFTY, 'supply/workVolts': 49 }, undefined],
  ] as const)('at %s', (_, base, edits, volts) => {
    expect(assessBase(base, edits).touch?.volts).toBe(volts);
  });

  it('is not given for a circuit of a system that is not answered', () => {
    expect(assessBase('O', { 'supply/system': gone }).touch).toBeNull();
  });
});

describe('what a clamp is to read (I = P / V)', () => {
  it.each([
    ['600 W at 120 V', {}, 5],
    ['a load that is not answered', { 'supply/watts': gone }, null],
    ['a voltage that is not answered', { 'supply/circuitVolts': gone }, null],
  ] as const)('%s', (_, edits, amperes) => {
    expect(assessBase('O', edits).expected.loadAmperes).toBe(amperes);
  });

  it('is not given past any number', () => {
    const { content, on } = soundWorksheet();
    const supply = { ...content.supply, watts: 1e308, circuitVolts: 1e-8 };
    expect(assess({ ...content, supply }, { on }).expected.loadAmperes).toBeNull();
  });
});

describe('beside a second system (the higher of the two can be reached)', () => {
  const other = (system: unknown): Edits => ({ 'sources/1/system': system });
  it.each<[string, Edits, number, string]>([
    ['none', {}, 120, 'one circuit'],
    ['the same one', other('208Y/120'), 120, 'one circuit'],
    ['a higher one', other('480Y/277'), 480, 'several systems'],
    ['a lower one', { 'supply/system': '120/240', ...other('208Y/120') }, 240, 'several systems'],
    [
      'a lower one, a single-phase load above 250 V to ground',
      { ...CIRCUIT_277, ...other('208Y/120') },
      480,
      'single-phase above 250 V to ground',
    ],
    [
      'a lower one beside whole equipment',
      { ...CIRCUIT_277, ...other('208Y/120'), 'supply/exposure': 'whole equipment' },
      480,
      'whole equipment',
    ],
  ])('%s', (_, edits, volts, because) => {
    expect(assessBase('O', edits).boundaries).toMatchObject({ volts, because });
  });

  it('asks the instrument for the highest that is known, or the lowest that there is', () => {
    const tester = (edits: Edits) =>
      assessBase('O', { 'supply/system': gone, ...edits }).equipment.find(
        ({ id }) => id === 'contact-tester',
      )?.params['volts'];
    expect(tester({})).toBe(208);
    expect(tester({ ...other('480Y/277'), 'sources/0/system': '208Y/120' })).toBe(480);
  });
});
