import { describe, expect, it } from 'vitest';
import { JOB_TASKS, REQUIRED_ITEM_IDS } from '@/hazard';
import { BELOW_FIFTY, CIRCUIT_277, FAR } from '../../support/ruleEdits';
import type { Base, Edits } from '../../support/ruleTable';
import { assessBase, gone } from '../../support/ruleTable';

const INSIDE_LIMITED: Edits = { ...FAR, 'crew/0/closest': 'limited' };
const LABEL = {
  ofThisEquipment: true,
  systemVolts: 208,
  reviewedOn: '2025-01-01',
  workingDistanceInches: 18,
  arcFlashBoundaryInches: 30,
};
const energy = (incidentEnergyCalPerCm2: number): Edits => ({
  'arcFlash/label': { ...LABEL, incidentEnergyCalPerCm2 },
  'arcFlash/clothingRatingCalPerCm2': 40,
});
const printed = (minimumArcRatingCalPerCm2: number): Edits => ({
  'arcFlash/label': { ...LABEL, minimumArcRatingCalPerCm2 },
  'arcFlash/clothingRatingCalPerCm2': 40,
});
const category = (ppeCategory: number): Edits => ({
  'arcFlash/label': { ...LABEL, ppeCategory },
  'arcFlash/clothingRatingCalPerCm2': 40,
});
const SURFACE = 'surroundings/groundedSurfaces/0/covered';

const ids = (base: Base, edits: Edits = {}) =>
  assessBase(base, edits).equipment.map((item) => item.id);

type Row = [id: string, base: Base, edits: Edits, isAsked: boolean];
const GLOVES: Row[] = ['rubber-insulating-gloves', 'leather-protectors'].flatMap((id): Row[] => [
  [id, 'O', {}, true],
  [id, 'T', {}, true],
  [id, 'W', {}, true],
  [id, 'O', { 'crew/0/closest': 'outside all boundaries' }, true],
  [id, 'W', { 'crew/0/closest': 'outside all boundaries' }, true],
  [id, 'T', { ...FAR, 'job/task': 'test or troubleshoot' }, true],
  [id, 'T', FAR, false],
  [id, 'T', { ...FAR, 'crew/0/closest': gone }, true],
  [id, 'W', BELOW_FIFTY, false],
]);
const HEAD: Row[] = ['safety-glasses', 'nonconductive-hard-hat'].flatMap((id): Row[] => [
  [id, 'O', {}, true],
  [id, 'T', {}, true],
  [id, 'W', {}, true],
  [id, 'T', INSIDE_LIMITED, true],
  [id, 'T', FAR, false],
]);
const ARC = [
  'arc-rated-shirt-and-trousers',
  'hearing-protection',
  'leather-footwear',
  'arc-rated-face-shield-or-hood',
];
const ARC_ROWS: Row[] = ARC.flatMap((id): Row[] => [
  [id, 'O', {}, true],
  [id, 'T', {}, true],
  [id, 'W', {}, true],
  [id, 'W', CIRCUIT_277, true],
  [id, 'O', category(1), true],
  [id, 'O', category(2), true],
  [id, 'O', energy(1.1), false],
  [id, 'O', energy(1.2), true],
  [id, 'O', energy(12), true],
  [id, 'O', printed(8), true],
  [id, 'T', FAR, false],
  [id, 'W', BELOW_FIFTY, false],
]);
const HOOD: Row[] = [
  ['O', {}, false],
  ['O', CIRCUIT_277, true],
  ['W', CIRCUIT_277, true],
  ['O', category(1), false],
  ['O', category(2), true],
  ['O', energy(1.1), false],
  ['O', energy(1.2), true],
  ['O', energy(12), true],
  ['O', printed(4), true],
].map((row) => ['arc-rated-balaclava-or-hood', ...row] as Row);
const SUIT: Row[] = ['arc-flash-suit-hood', 'arc-rated-gloves'].flatMap((id): Row[] => [
  [id, 'O', {}, false],
  [id, 'O', category(2), false],
  [id, 'O', category(3), true],
  [id, 'O', category(4), true],
  [id, 'O', energy(12), false],
  [id, 'O', energy(12.1), true],
  [id, 'W', energy(40), true],
  [id, 'O', printed(12), false],
  [id, 'O', printed(25), true],
]);
const TESTER: Row[] = ['contact-tester', 'known-source'].flatMap((id): Row[] => [
  [id, 'O', {}, true],
  [id, 'O', { 'job/task': 'inspect' }, true],
  [id, 'T', {}, true],
  [id, 'T', FAR, false],
  [id, 'W', {}, false],
  [id, 'W', { 'job/task': 'test or troubleshoot' }, false],
]);
const OFF_ONLY: Row[] = [
  'lock-and-tag',
  'written-lockout-procedure',
  'work-light',
  'insulated-probes',
].flatMap((id): Row[] => [
  [id, 'O', {}, true],
  [id, 'T', {}, false],
  [id, 'W', {}, false],
]);

const ROWS: Row[] = [
  ...GLOVES,
  ['insulated-tools', 'T', {}, true],
  ['insulated-tools', 'W', {}, true],
  ['insulated-tools', 'O', {}, false],
  ['insulated-tools', 'T', FAR, false],
  ['insulated-tools', 'W', BELOW_FIFTY, false],
  ...HEAD,
  ['nonmelting-clothing', 'O', {}, true],
  ['nonmelting-clothing', 'T', FAR, true],
  ['nonmelting-clothing', 'W', BELOW_FIFTY, true],
  ...ARC_ROWS,
  ...HOOD,
  ...SUIT,
  ...TESTER,
  ['clamp-ammeter', 'O', {}, true],
  ['clamp-ammeter', 'O', { 'job/task': 'inspect' }, false],
  ['clamp-ammeter', 'O', { 'supply/circuitVolts': 208 }, false],
  ['clamp-ammeter', 'T', {}, false],
  ['clamp-ammeter', 'W', {}, false],
  ...OFF_ONLY,
  ['insulating-covers', 'O', { [SURFACE]: true }, true],
  ['insulating-covers', 'O', { [SURFACE]: false }, false],
  ['insulating-covers', 'W', { [SURFACE]: true }, true],
  ['insulating-covers', 'T', { 'surroundings/groundedSurfaces': [] }, false],
  ...(['O', 'T', 'W'] as const).flatMap((base): Row[] => [
    ['nonconductive-ladder', base, {}, true],
    ['nonconductive-ladder', base, { 'surroundings/access': 'extension ladder' }, true],
    ['nonconductive-ladder', base, { 'surroundings/access': 'floor' }, false],
    ['nonconductive-ladder', base, { 'surroundings/access': 'lift' }, false],
    ['barricade-and-signs', base, {}, false],
    ['barricade-and-signs', base, { 'surroundings/peopleMayApproach': true }, true],
    ['barricade-and-signs', base, { 'surroundings/peopleMayApproach': gone }, true],
  ]),
];

describe('what must be at hand (1910.335; 70E Tables 130.5(G), 130.7(C)(15)(c))', () => {
  it.each(ROWS)('%s, %s %j: asked %s', (id, base, edits, isAsked) => {
    expect(ids(base, edits).includes(id)).toBe(isAsked);
  });

  it.each<[string, Base, Edits]>([
    ['the clamp ammeter', 'O', { 'supply/neutralShared': 'yes' }],
    ['the clamp ammeter', 'O', { 'supply/neutralShared': 'not known' }],
  ])('%s, %s %j', (_name, base, edits) => {
    expect(ids(base, edits)).toContain('clamp-ammeter');
  });

  const param = (base: Base, id: string, edits: Edits = {}) =>
    Object.values(assessBase(base, edits).equipment.find((item) => item.id === id)?.params ?? {});

  it('names the glove class that is enough', () => {
    expect(param('O', 'rubber-insulating-gloves')).toContain('00');
    expect(param('W', 'rubber-insulating-gloves', CIRCUIT_277)).toContain('00');
  });

  it('names the arc rating', () => {
    expect(param('O', 'arc-rated-shirt-and-trousers')).toContain(4);
    expect(param('O', 'arc-rated-shirt-and-trousers', CIRCUIT_277)).toContain(8);
    expect(param('O', 'arc-rated-shirt-and-trousers', energy(9.5))).toContain(9.5);
  });

  it('names the category and the voltage of the tester', () => {
    expect(param('O', 'contact-tester')).toEqual(expect.arrayContaining(['III', 208]));
    expect(param('T', 'contact-tester', { 'supply/atService': true })).toEqual(
      expect.arrayContaining(['IV', 208]),
    );
    expect(param('O', 'contact-tester', { 'sources/1/system': '480Y/277' })).toContain(480);
  });

  it.each(JOB_TASKS)(
    'the tester for %s reads direct current only where the task table says so',
    (task) => {
      const known = JSON.stringify(param('O', 'contact-tester', { 'job/task': task }));
      const isDirect = task === 'replace battery unit';
      expect(/dc/i.test(known)).toBe(isDirect);
    },
  );

  it('asks the tester for direct current where one of several sources is a battery', () => {
    const batteries = { 'sources/2/kind': 'battery unit' };
    expect(param('O', 'contact-tester', batteries)).toContain('ac and dc');
  });

  it('lists them from what is worn to what stands around the work', () => {
    for (const [base, edits] of [
      ['O', energy(30)],
      ['O', { ...CIRCUIT_277, [SURFACE]: true, 'surroundings/peopleMayApproach': true }],
      ['T', {}],
      ['W', category(4)],
    ] as const) {
      const listed = ids(base, edits);
      expect(listed).toEqual(REQUIRED_ITEM_IDS.filter((id) => listed.includes(id)));
    }
  });

  it('cites the table that the rating comes from', () => {
    const table = (edits: Edits) =>
      assessBase('O', edits).equipment.find(({ id }) => id === 'hearing-protection')?.citation
        .table;
    expect(table(category(2))).toBe('Table 130.7(C)(15)(c)');
    expect(table(energy(8))).toBe('Table 130.5(G)');
  });

  it('cites where each item comes from', () => {
    for (const base of ['O', 'T', 'W'] as const) {
      for (const { citation, id } of assessBase(base, CIRCUIT_277).equipment) {
        expect(citation.confidence, id).toBeTruthy();
        expect(citation.standard, id).toBeTruthy();
      }
    }
  });
});
