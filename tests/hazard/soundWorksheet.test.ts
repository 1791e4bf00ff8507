import { describe, expect, it } from 'vitest';
import { assess, BRIEFING_TOPICS } from '@/hazard';
import type { Stage } from '@/hazard';
import {
  soundEnergizedWorksheet,
  soundTestingWorksheet,
  soundWorksheet,
  withPath,
} from '../support/soundWorksheet';
import type { SoundWorksheet } from '../support/soundWorksheet';
import { pointersOf } from '../support/pointers';

const STAGES: Stage[] = ['plan', 'work', 'close-out'];

/** What a worksheet of each path holds beside its content at a stage. */
function assessAt({ content, on, proof, closeOut }: SoundWorksheet, stage: Stage) {
  return assess(content, { on, stage, proof, closeOut });
}

const unsettled = (sound: SoundWorksheet, stage: Stage) =>
  assessAt(sound, stage).findings.filter(({ severity }) => severity !== 'caution');

/** Answers with no bearing on safety, or that only ever add a finding. */
const OPTIONAL = [
  'job/(workOrder|lamps)',
  'supply/(watts|readings|conductorColors)',
  'crew/\\d/userId',
];
/** Answers whose absence counts as the worse case: what it costs shows elsewhere, or not at all. */
const WORSE_WHEN_ABSENT = [
  'supply/(exposure|movableConductors)',
  'arcFlash/normal',
  'job/occupied',
  'egressReaches',
  'crew/0/worksOnCircuit',
  // A traveler of its own is read at work.
  'sources/2/sameConductorsAs',
  'surroundings/groundedSurfaces/0/(kind|inReach|covered)',
  // Without a day of issue the six months run from the test, which is never later.
  'protectiveEquipment/gloves/issuedOn',
];
/** Asked only where another answer asks for it, which none does here. */
const NOT_ASKED_HERE = [
  'egress',
  'crew/1/lead',
  'sources/\\d/(allPhasesOpened|lockedBy)',
  'sources/1/upstreamOfTransfer',
];
const EXEMPT = new RegExp(
  `^/(${[...OPTIONAL, ...WORSE_WHEN_ABSENT, ...NOT_ASKED_HERE].join('|')})(/.*)?$`,
);
/** Whole elements of a list, and the one topic that is briefed only with a permit. */
const NO_ANSWERS = [
  '/surroundings/groundedSurfaces/0',
  '/crew/1',
  `/briefing/topics/${BRIEFING_TOPICS.indexOf('permit')}`,
];
const isExempt = (pointer: string) => EXEMPT.test(pointer) || NO_ANSWERS.includes(pointer);

describe('a worksheet that answers everything soundly', () => {
  it.each(STAGES)('is ready at the stage %s', (stage) => {
    expect(unsettled(soundWorksheet(), stage)).toEqual([]);
    expect(assessAt(soundWorksheet(), stage).verdict).toBe('ready');
  });

  it.each(STAGES)('is ready when energized at the stage %s', (stage) => {
    expect(unsettled(soundTestingWorksheet(), stage)).toEqual([]);
    expect(unsettled(soundEnergizedWorksheet(), stage)).toEqual([]);
  });

  it('shows the cautions that its answers call for, and no others', () => {
    const cautions = assessAt(soundWorksheet(), 'plan').findings.map(({ code }) => code);
    expect(cautions).toEqual(['sources.transfer-starts']);
  });

  it('has the figures of its supply', () => {
    const { boundaries, barricade, arcFlash, permit, expected, touch, edition } = assessAt(
      soundWorksheet(),
      'plan',
    );
    expect(edition).toBe('NFPA 70E-2024');
    expect(boundaries).toMatchObject({
      inTable: true,
      volts: 120,
      because: 'one circuit',
      movable: false,
      limitedFixed: { inches: 42, metres: 1 },
      restricted: 'avoid contact',
    });
    expect(barricade).toMatchObject({ inches: 42, metres: 1 });
    expect(arcFlash).toMatchObject({
      likely: true,
      method: 'ppe category',
      ppeCategory: 1,
      requiredArcRatingCalPerCm2: 4,
      arcFlashBoundary: { inches: 19, metres: 0.485 },
      findings: [],
    });
    expect(permit).toMatchObject({ required: false, exemption: '130.2(C)(1)' });
    expect(expected.loadAmperes).toBeCloseTo(5, 9);
    expect(touch?.p5).toBeCloseTo(130.7, 1);
  });

  it('needs every topic but the permit, which is not required here', () => {
    const { content, on } = soundWorksheet();
    const topics = BRIEFING_TOPICS.filter((topic) => topic !== 'permit');
    expect(assess(withPath(content, '/briefing/topics', topics), { on }).verdict).toBe('ready');
  });
});

const sound = soundWorksheet();

describe('an answer that is taken out', () => {
  const pointers = pointersOf(sound.content).filter((pointer) => !isExempt(pointer));

  it.each(pointers)('%s: is asked for at the plan', (pointer) => {
    const content = withPath(sound.content, pointer, undefined);
    const without = assess(content, { on: sound.on });
    expect(without.verdict).not.toBe('ready');
  });

  it.each(pointersOf(sound.proof).filter((pointer) => !/readings\/\d+\/current$/.test(pointer)))(
    '%s of the proof: is asked for at work',
    (pointer) => {
      const { content, on } = sound;
      const proof = withPath(sound.proof, pointer, undefined);
      expect(assess(content, { on, stage: 'work', proof }).verdict).not.toBe('ready');
    },
  );

  it.each(pointersOf(sound.closeOut).filter((pointer) => pointer !== '/egressTestedSeconds'))(
    '%s of the close-out: is asked for at the end',
    (pointer) => {
      const { content, on, proof } = sound;
      const closeOut = withPath(sound.closeOut, pointer, undefined);
      const { verdict } = assess(content, { on, stage: 'close-out', proof, closeOut });
      expect(verdict).not.toBe('ready');
    },
  );
});

describe('nothing answered', () => {
  it('is open, and holds no stop', () => {
    const { findings, verdict } = assess({}, { on: sound.on });
    expect(verdict).toBe('open');
    expect(findings.filter(({ severity }) => severity === 'stop')).toEqual([]);
  });

  it.each(STAGES)('asks only for what is missing at the stage %s', (stage) => {
    for (const content of [{}, null, undefined, [], 'text', 7]) {
      const { findings } = assess(content, { on: sound.on, stage });
      expect(findings.every(({ severity }) => severity === 'open')).toBe(true);
    }
  });

  it('gives no figure of a voltage that is not known', () => {
    const { boundaries, barricade, touch, expected, arcFlash } = assess({}, { on: sound.on });
    expect({ boundaries, barricade, touch }).toEqual({
      boundaries: null,
      barricade: null,
      touch: null,
    });
    expect(expected.loadAmperes).toBeNull();
    expect(arcFlash).toMatchObject({ likely: true, method: 'study needed', ppeCategory: null });
  });

  it.each(['', 'today', '2026-12-01', '2026-12-01T09:00:00', '2026-02-30T09:00:00Z'])(
    'throws on the time %j',
    (on) => {
      expect(() => assess({}, { on })).toThrow(RangeError);
    },
  );

  it('throws on a stage that it does not know', () => {
    expect(() => assess({}, { on: sound.on, stage: 'later' as Stage })).toThrow(RangeError);
  });
});
