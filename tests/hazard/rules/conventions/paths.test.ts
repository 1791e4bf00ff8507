import { describe, expect, it } from 'vitest';
import { JOB_TASKS } from '@/hazard';
import { BELOW_FIFTY } from '../../../support/ruleEdits';
import type { Edits } from '../../../support/ruleTable';
import { assessBase, found, gone, unsettled } from '../../../support/ruleTable';

describe('the four paths (convention 4)', () => {
  const isW = (result: ReturnType<typeof assessBase>) =>
    found(result, 'decision.alternative-possible').length > 0;
  const asked: Edits = { 'decision/outageRefusedBy': gone };

  it.each<[string, Edits, boolean]>([
    ['a testing task because of testing', { 'decision/reason': 'testing' }, false],
    [
      'a testing task, infeasible otherwise',
      {
        'decision/reason': 'infeasible',
        'decision/infeasibleBecause': 'can only be tested energized',
      },
      false,
    ],
    [
      'a testing task, another infeasibility',
      { 'decision/reason': 'infeasible', 'decision/infeasibleBecause': 'other' },
      true,
    ],
    ['a testing task, infeasibility not answered', { 'decision/reason': 'infeasible' }, true],
    ['a testing task, additional hazard', { 'decision/reason': 'additional hazard' }, true],
    ['a testing task, no reason', { 'decision/reason': gone }, true],
  ])('%s', (_title, edits, expected) => {
    expect(isW(assessBase('T', { ...asked, ...edits }))).toBe(expected);
  });

  it.each(JOB_TASKS)('%s because of testing', (task) => {
    const isTesting = ['trace circuit', 'test or troubleshoot', 'inspect', 'thermography'].includes(
      task,
    );
    expect(isW(assessBase('T', { ...asked, 'job/task': task }))).toBe(!isTesting);
  });

  it('a task that is not answered takes the rules of W', () => {
    expect(isW(assessBase('T', { ...asked, 'job/task': gone }))).toBe(true);
  });

  it('below 50 V the named rows, the arc flash fields and the gloves do not apply', () => {
    const result = assessBase('W', {
      ...BELOW_FIFTY,
      'crew/1': gone,
      'decision/permit': gone,
      arcFlash: gone,
      'protectiveEquipment/gloves': gone,
      'surroundings/groundedSurfaces': gone,
      'surroundings/conductiveArticlesRemoved': false,
      'surroundings/peopleMayApproach': true,
      'crew/0/closest': 'restricted',
    });
    expect(unsettled(result)).toEqual([]);
    expect(result.permit).toMatchObject({ required: false, because: 'below 50 V' });
  });

  it.each<[string, Edits, string]>([
    ['damage', { 'supply/damage': true }, 'stop equipment.damaged'],
    ['wet', { 'surroundings/wet': true }, 'stop surroundings.wet'],
    ['dark', { 'surroundings/lightAdequate': gone }, 'open surroundings.dark'],
    ['no explanation', { 'decision/explanation': gone }, 'open decision.explanation-missing'],
    ['scope', { 'job/special': ['utility side'] }, 'stop job.outside-scope'],
    [
      'ladder',
      { 'surroundings/ladder/material': 'aluminum' },
      'stop surroundings.ladder-conductive',
    ],
    ['lead', { 'crew/0/qualified': false }, 'stop crew.lead-unqualified'],
  ])('below 50 V every other row of W does: %s', (_title, edits, expected) => {
    const entries = unsettled(assessBase('W', { ...BELOW_FIFTY, ...edits }));
    expect(entries.map((entry) => entry.split(' ').slice(0, 2).join(' '))).toEqual([expected]);
  });

  it.each<[string, Edits]>([
    ['50 V', { 'supply/workVolts': 50 }],
    ['not answered', { 'supply/workVolts': gone }],
    ['higher exposed', { 'supply/higherVoltsExposed': true }],
    ['higher not answered', { 'supply/higherVoltsExposed': gone }],
  ])('the exception does not hold at %s', (_title, edits) => {
    const result = assessBase('W', {
      ...BELOW_FIFTY,
      ...edits,
      'decision/permit': gone,
      'surroundings/groundedSurfaces': [{}],
      'crew/1': gone,
    });
    const codes = result.findings.map(({ code }) => code);
    expect(codes).toEqual(
      expect.arrayContaining(['permit.missing', 'shock.grounded-surface', 'crew.alone']),
    );
  });
});
