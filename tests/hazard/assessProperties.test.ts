import fc from 'fast-check';
import { describe, expect, it, vi } from 'vitest';
import { assess, RULE_CODES, SOURCE_KINDS } from '@/hazard';
import type {
  Assessment,
  Closest,
  CrewMember,
  EnergySource,
  Stage,
  WorksheetContent,
} from '@/hazard';
import * as E from '@/hazard/enumerations';
import { pointersOf } from '../support/pointers';
import '../support/propertyRuns';
import {
  soundEnergizedWorksheet,
  soundTestingWorksheet,
  soundWorksheet,
  withPath,
} from '../support/soundWorksheet';

/** Beside other work on the machine a property may take its time. */
vi.setConfig({ testTimeout: 120_000 });

const ON = soundWorksheet().on;
const STAGES: Stage[] = ['plan', 'work', 'close-out'];
const BASES = [soundWorksheet(), soundTestingWorksheet(), soundEnergizedWorksheet()];
const WORDS = Object.values(E).filter(Array.isArray).flat() as string[];
const RANK = { ready: 0, open: 1, stop: 2 };
const SEVERITY_RANK = { caution: 0, open: 1, stop: 2 };

/** Any answer that a form, a faulty client or an attacker may send. */
const anyAnswer = fc.oneof(
  fc.constant(undefined),
  fc.boolean(),
  fc.constantFrom<unknown>(...WORDS, 's1', 's2', 'c1', 'c2', '', ' ', '2026-12-01', ON),
  fc.constantFrom<unknown>(0, -1, 1, 2, 24, 50, 120, 208, 277, 480, 1e9, NaN, Infinity, null),
  fc.constantFrom<unknown>([], {}, ['unknown'], ['moon'], [{}], [null]),
);

interface Spoilt {
  content: WorksheetContent;
  proof: unknown;
  closeOut: unknown;
  stage: Stage;
}

/** A sound worksheet with a few answers changed; `kept` are pointers that stay as they are. */
function spoiltWorksheet(kept: RegExp = /^$/): fc.Arbitrary<Spoilt> {
  return fc.constantFrom(...BASES).chain(({ content, proof, closeOut }) => {
    const pointers = pointersOf({ content, proof, closeOut }).filter(
      (pointer) => /^\/\w+\//.test(pointer) && !kept.test(pointer),
    );
    const change = fc.tuple(fc.constantFrom(...pointers), anyAnswer);
    return fc
      .record({
        changes: fc.array(change, { maxLength: 5 }),
        stage: fc.constantFrom(...STAGES),
      })
      .map(({ changes, stage }) => {
        let root: unknown = { content, proof, closeOut };
        for (const [pointer, value] of changes) root = withPath(root, pointer, value);
        return { ...(root as Spoilt), stage };
      });
  });
}

const assessed = ({ content, ...options }: Spoilt) => assess(content, { on: ON, ...options });

/** The codes of findings that another assessment has no longer, or has less severely. */
function removedCodes(before: Assessment, after: Assessment): string[] {
  const worst = (assessment: Assessment, code: string) =>
    Math.max(
      -1,
      ...assessment.findings
        .filter((finding) => finding.code === code)
        .map(({ severity }) => SEVERITY_RANK[severity]),
    );
  return RULE_CODES.filter((code) => worst(after, code) < worst(before, code));
}

function frozen<T>(value: T): T {
  if (typeof value !== 'object' || value === null || Object.isFrozen(value)) return value;
  Object.freeze(value);
  Object.values(value).forEach(frozen);
  return value;
}

function expectSound(result: Assessment) {
  const severities = result.findings.map(({ severity }) => severity);
  const worst = severities.includes('stop')
    ? 'stop'
    : severities.includes('open')
      ? 'open'
      : 'ready';
  expect(result.verdict).toBe(worst);
  const order = result.findings.map(({ code }) => RULE_CODES.indexOf(code));
  expect(order).not.toContain(-1);
  expect(order).toEqual([...order].sort((one, other) => one - other));
  for (const { path, params, citation } of result.findings) {
    expect(path).toMatch(/^\/\w+/);
    expect(citation.confidence).toBeTruthy();
    expect(Object.values(params)).not.toContain(undefined);
  }
}

describe('assess never throws', () => {
  it('on anything at all', () => {
    const any = fc.anything({ maxDepth: 3 });
    fc.assert(
      fc.property(any, any, any, fc.constantFrom(...STAGES), (content, proof, closeOut, stage) => {
        expectSound(assess(content, { on: ON, stage, proof, closeOut }));
      }),
    );
  });

  it('on anything in a section of the content', () => {
    const value = fc.oneof(fc.jsonValue({ maxDepth: 2 }), fc.object({ maxDepth: 2 }));
    const sections = Object.keys(soundWorksheet().content);
    fc.assert(
      fc.property(
        fc.dictionary(fc.constantFrom(...sections), value, { maxKeys: 4 }),
        fc.dictionary(fc.constantFrom('readings', 'openedSources'), value),
        (content, proof) => {
          expectSound(assess(content, { on: ON, stage: 'work', proof }));
        },
      ),
    );
  });

  it('on a worksheet with a few answers spoilt', () => {
    fc.assert(
      fc.property(spoiltWorksheet(), (spoilt) => {
        expectSound(assessed(spoilt));
      }),
    );
  });
});

describe('assess is a function of its input', () => {
  it('gives the same output for the same input, and leaves the input as it is', () => {
    fc.assert(
      fc.property(spoiltWorksheet(), (spoilt) => {
        const result = assessed(frozen(structuredClone(spoilt)));
        expect(assessed(spoilt)).toEqual(result);
        expect(JSON.stringify(assessed(spoilt))).toBe(JSON.stringify(result));
      }),
    );
  });
});

const HELD: EnergySource = {
  held: 'lock and tag',
  lockNumber: '12',
  lockedBy: ['c1'],
  byCrewId: 'c1',
};
const OPENED = [undefined, ...E.OPENED_AT];

describe('a further source', () => {
  /** The rules that ask for a source of some kind. */
  const ASKING = [
    'sources.none',
    'sources.egress-not-listed',
    'sources.traveler-unlisted',
    'sources.control-unlisted',
    'sources.shared-neutral',
    'sources.battery-connected',
  ];
  // A new source may be what another one names as its own conductors, or make a list of none.
  const asked = spoiltWorksheet(/^\/content\/sources(\/\d+(\/(id|sameConductorsAs))?)?$/);

  it('removes only the rules that ask for one', () => {
    const kinds = fc.constantFrom(undefined, ...SOURCE_KINDS);
    fc.assert(
      fc.property(asked, kinds, fc.constantFrom(...OPENED), (spoilt, kind, openedAt) => {
        const source = { id: 'new', from: 'Found behind the grid', kind, openedAt, ...HELD };
        const sources = [...(spoilt.content.sources ?? []), source];
        const after = assessed({ ...spoilt, content: { ...spoilt.content, sources } });
        const removed = removedCodes(assessed(spoilt), after);
        expect(removed.filter((code) => !ASKING.includes(code))).toEqual([]);
      }),
    );
  });

  it('that is not opened never makes it less strict', () => {
    fc.assert(
      fc.property(fc.constantFrom(...SOURCE_KINDS), fc.constantFrom('plan', 'work'), (kind, at) => {
        const { content, proof } = soundWorksheet();
        const source = { id: 'new', from: 'LA-2 ckt 3', kind, openedAt: 'none' as const, ...HELD };
        const sources = [...(content.sources ?? []), source];
        const result = assess({ ...content, sources }, { on: ON, stage: at, proof });
        expect(result.verdict).toBe('stop');
      }),
    );
  });
});

describe('a person', () => {
  const NEARER: Closest[] = [
    'outside all boundaries',
    'outside limited',
    'limited with escort',
    'limited',
    'restricted',
  ];

  it('who is not qualified and comes nearer never makes it less strict', () => {
    const steps = fc.integer({ min: 0, max: NEARER.length - 2 });
    const kept = /^\/content\/crew(\/1(\/.*)?)?$/;
    fc.assert(
      fc.property(spoiltWorksheet(kept), steps, (spoilt, step) => {
        const at = (closest: Closest | undefined) =>
          assessed(withPath(spoilt, '/content/crew/1/closest', closest));
        const [far, near] = [at(NEARER[step]), at(NEARER[step + 1])];
        expect(RANK[near.verdict]).toBeGreaterThanOrEqual(RANK[far.verdict]);
      }),
    );
  });

  it('who is qualified, and a second one, removes only what one alone breaks', () => {
    const REMOVED = [
      'crew.alone',
      'crew.rescue-untrained',
      'shock.escort-is-working',
      // Of this row only the half that asks for an escort.
      'shock.unqualified-inside',
    ];
    const second: CrewMember = {
      id: 'new',
      name: 'Second',
      lead: false,
      qualified: true,
      qualifiedThrough: '2028-01-01',
      closest: 'outside all boundaries',
      arcRated: true,
      rescueTrained: true,
      worksOnCircuit: false,
    };
    fc.assert(
      fc.property(spoiltWorksheet(/^\/content\/crew(\/\d+)?$/), (spoilt) => {
        const crew = [...(spoilt.content.crew ?? []), second];
        const after = assessed({ ...spoilt, content: { ...spoilt.content, crew } });
        const removed = removedCodes(assessed(spoilt), after);
        expect(removed.filter((code) => !REMOVED.includes(code))).toEqual([]);
      }),
    );
  });
});

describe('a grounded surface in reach that is not covered', () => {
  it('never makes it less strict', () => {
    const kept = /^\/content\/surroundings(\/groundedSurfaces)?$/;
    fc.assert(
      fc.property(spoiltWorksheet(kept), (spoilt) => {
        const surfaces = spoilt.content.surroundings?.groundedSurfaces ?? [];
        const surface = { kind: 'duct', inReach: true, covered: false, keptClear: false };
        const more = [...surfaces, surface];
        const after = assessed(withPath(spoilt, '/content/surroundings/groundedSurfaces', more));
        expect(removedCodes(assessed(spoilt), after)).toEqual([]);
        expect(spoilt.stage === 'close-out' || after.verdict === 'stop').toBe(true);
      }),
    );
  });
});
