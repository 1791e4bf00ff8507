import { describe, expect, it } from 'vitest';
import type { CrewMember, SurroundingsSection, WorksheetContent } from '@/hazard/content';
import { farthestFeet } from '@/shared/drawing/zones';
import {
  distanceLines,
  sectionInputOf,
  voltageLine,
  zonesOfWorksheet,
  type DrawingSubject,
} from '@/shared/drawing/worksheetDrawing';
import { assessmentOf, at, citation, fixed277, subjectOf } from '../../support/drawings';

/** Figures have no-break spaces; they are compared with ordinary ones. */
const plain = (words: string) => words.replaceAll('\u00a0', ' ');
const known = assessmentOf(fixed277);
const linesOf = (assessment: DrawingSubject['assessment']) =>
  distanceLines(subjectOf(assessment)).map(plain);
const inputOf = (content: WorksheetContent) =>
  sectionInputOf(subjectOf(known, { content }), {
    width: 358,
    pixelsPerFoot: 33,
    medium: 'screen',
  });

describe('the distances in words', () => {
  const below50 = {
    ...known.boundaries,
    limitedMovable: null,
    limitedFixed: null,
    restricted: null,
  };

  it('are not known before the voltage is', () => {
    const lines = linesOf({ ...known, boundaries: null, barricade: null });
    expect(lines).toEqual(['Distances: not known until section 2 is complete.']);
  });

  it('are none past the last row of the table, not even that of an arc flash', () => {
    const boundaries = {
      inTable: false,
      volts: 20_000,
      because: '',
      movable: false,
      citation,
    } as const;
    const assessment = { ...known, boundaries, barricade: null };
    expect(linesOf(assessment)).toEqual([
      'Distances: outside the table. Ask for an engineering study.',
    ]);
    const zones = zonesOfWorksheet(subjectOf(assessment));
    expect(zones.message).toBe('Distances: outside the table. Ask for an engineering study');
    expect(zones.zones).toEqual([]);
    expect(farthestFeet(zones)).toBe(0);
  });

  it('are not specified below 50 V where no arc flash is to be feared', () => {
    const { arcFlash } = assessmentOf({ ...fixed277, arcFlash: null, method: 'not likely' });
    const assessment = { arcFlash, boundaries: below50, barricade: null };
    expect(linesOf(assessment)).toEqual(['Distances: not specified below 50 V.']);
    expect(zonesOfWorksheet(subjectOf(assessment)).zones).toEqual([]);
  });

  it('are those of the arc flash alone below 50 V where a label names one', () => {
    const assessment = { ...known, boundaries: below50 };
    expect(linesOf(assessment)).toEqual([
      'Arc flash boundary: 5 ft 0 in (1.5 m).',
      'Barricade, at least: 5 ft 0 in (1.5 m).',
    ]);
    const { zones } = zonesOfWorksheet(subjectOf(assessment));
    expect(zones.map(({ role, feet }) => [role, feet])).toEqual([['arcFlash', 5]]);
  });

  it('say "avoid contact" for what has no distance, and that an arc flash is not likely', () => {
    const situation = { ...fixed277, arcFlash: null, method: 'not likely' } as const;
    expect(linesOf(assessmentOf({ ...situation, restricted: 'avoid contact' }))).toEqual([
      'Restricted approach boundary: Avoid contact.',
      'Limited approach boundary, fixed: 3 ft 6 in (1.0 m).',
      'An arc flash is not likely. Not likely is not impossible.',
      'Barricade, at least: 3 ft 6 in (1.0 m).',
    ]);
  });

  it('are farther from conductors that can move', () => {
    expect(linesOf(assessmentOf({ ...fixed277, movable: true }))).toEqual([
      'Restricted approach boundary: 1 ft 0 in (0.3 m).',
      'Limited approach boundary, movable: 10 ft 0 in (3.0 m).',
      'Arc flash boundary: 5 ft 0 in (1.5 m).',
      'Barricade, at least: 10 ft 0 in (3.0 m).',
    ]);
  });

  it.each([null, { ...at(0, 0), citation }])('name no barricade where none stands', (barricade) => {
    const assessment = { ...known, barricade };
    expect(linesOf(assessment).join(' ')).not.toContain('Barricade');
    expect(zonesOfWorksheet(subjectOf(assessment)).barricade).toBeNull();
  });
});

describe('the voltage of the distances', () => {
  const lineAt = (
    content: WorksheetContent,
    boundaries: DrawingSubject['assessment']['boundaries'],
  ) => {
    const { volts, rest } = voltageLine(subjectOf({ ...known, boundaries }, { content }));
    return [volts && plain(volts), plain(rest)];
  };

  it('is said with the circuit that it was taken for', () => {
    const content = { supply: { circuitVolts: 277 } };
    expect(lineAt(content, known.boundaries)).toEqual(['480 V', 'phase-to-phase, from 277 V']);
  });

  it.each([{ supply: { circuitVolts: 480 } }, { supply: {} }, {}])(
    'is said alone where the circuit has no other: %j',
    (content) => {
      expect(lineAt(content, known.boundaries)).toEqual(['480 V', 'phase-to-phase']);
    },
  );

  it('is said to be unknown before it is answered', () => {
    expect(lineAt({}, null)).toEqual([null, 'Voltage not known']);
  });
});

describe('the people of the drawing', () => {
  const peopleOf = (crew: CrewMember[], content: WorksheetContent = {}) =>
    inputOf({ ...content, crew }).people;
  const lead: CrewMember = { id: 'a', lead: true };
  const helper: CrewMember = { id: 'b' };

  it('are none before a crew is named', () => {
    expect(inputOf({}).people).toEqual([]);
  });

  it('are a lead at the exposed part and no helper before it is answered how close they come', () => {
    expect(peopleOf([lead, helper])).toEqual([{ closest: 'restricted', label: 'Lead' }]);
  });

  it('who come equally close stand together, with or without an escort', () => {
    const crew: CrewMember[] = [
      { ...lead, closest: 'limited' },
      { ...helper, closest: 'limited with escort' },
      { id: 'c', closest: 'outside limited' },
      { id: 'd', closest: 'outside limited' },
      { id: 'e', closest: 'outside all boundaries' },
    ];
    expect(peopleOf(crew)).toEqual([
      { closest: 'limited', label: 'Lead, Helper' },
      { closest: 'outside limited', label: '2 helpers' },
      { closest: 'outside all boundaries', label: 'Helper' },
    ]);
  });

  describe('who test for absence of voltage', () => {
    const far: CrewMember[] = [
      { ...lead, closest: 'outside limited' },
      { ...helper, closest: 'outside limited' },
    ];
    const atThePart = [
      { closest: 'outside limited', label: 'Lead' },
      { closest: 'restricted', label: 'Helper' },
    ];
    const absenceTest = { byCrewId: 'b' };

    it.each<WorksheetContent>([
      {},
      { decision: { mode: 'off' } },
      { decision: { mode: 'energized' }, job: { task: 'test or troubleshoot' } },
    ])('are at the part whatever else is answered: %j', (content) => {
      expect(peopleOf(far, { ...content, absenceTest })).toEqual(atThePart);
    });

    it.each<WorksheetContent>([{}, { job: { task: 'replace lamp' } }])(
      'are where it is answered when the part stays live and nothing is tested: %j',
      (content) => {
        const live = { ...content, absenceTest, decision: { mode: 'energized' } as const };
        expect(peopleOf(far, live)).toEqual([
          { closest: 'outside limited', label: 'Lead, Helper' },
        ]);
      },
    );

    it('are nobody before it is answered who tests', () => {
      expect(peopleOf([{ closest: 'outside limited' }], { absenceTest: {} })).toEqual([
        { closest: 'outside limited', label: 'Helper' },
      ]);
    });
  });
});

describe('what is climbed on', () => {
  const ladder = { material: 'fiberglass', sizeFeet: 6, standingLevelFeet: 3 } as const;

  it.each<[SurroundingsSection | undefined, string[]]>([
    [undefined, []],
    [{}, []],
    [{ access: 'floor', ladder }, []],
    [{ access: 'lift', ladder }, ['Lift']],
    [{ access: 'stepladder' }, ['Stepladder']],
    [{ access: 'stepladder', ladder: { sizeFeet: 0 } }, ['Stepladder']],
    [{ access: 'stepladder', ladder: { sizeFeet: 6.5 } }, ['Stepladder, 6 ft 6 in']],
    [{ access: 'stepladder', ladder: { material: 'aluminum' } }, ['Aluminum']],
    [
      { access: 'stepladder', ladder: { standingLevelFeet: 2 } },
      ['Stepladder', 'standing at 2 ft'],
    ],
    [{ access: 'stepladder', ladder }, ['Fiberglass, 6 ft', 'standing at 3 ft']],
  ])('is named as far as it is answered: %j', (surroundings, words) => {
    const content = surroundings ? { surroundings } : {};
    expect(inputOf(content).words.access.map(plain)).toEqual(words);
  });
});

describe('the ceiling and what is grounded', () => {
  const ceilingOf = (surroundings: SurroundingsSection) =>
    plain(inputOf({ surroundings }).words.ceiling);

  it('are named with the height', () => {
    expect(ceilingOf({ ceilingHeightFeet: 9.5 })).toBe('Ceiling, 9 ft 6 in');
    const groundedSurfaces = [{ kind: 'ceiling grid' as const }];
    expect(ceilingOf({ ceilingHeightFeet: 9, groundedSurfaces })).toBe('Grounded grid, 9 ft');
  });

  it.each([{}, { ceilingHeightFeet: 0 }])('say that no height is known: %j', (surroundings) => {
    expect(ceilingOf(surroundings)).toBe('Ceiling height not known, drawn at 9 ft');
    expect(inputOf({ surroundings }).ceilingHeightFeet).toBeNull();
  });

  it('count as in reach until it is answered that they are not', () => {
    const groundedSurfaces: SurroundingsSection['groundedSurfaces'] = [
      { kind: 'duct' },
      { kind: 'pipe', inReach: true },
      { kind: 'conduit', inReach: false },
      { inReach: true },
    ];
    expect(inputOf({ surroundings: { groundedSurfaces } }).grounded).toEqual([
      { kind: 'duct', label: 'Duct' },
      { kind: 'pipe', label: 'Pipe' },
    ]);
  });
});
