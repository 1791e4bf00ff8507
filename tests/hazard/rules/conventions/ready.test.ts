import { describe, expect, it } from 'vitest';
import { assess, BRIEFING_TOPICS, JOB_TASKS, SYSTEMS, TASKS } from '@/hazard';
import type { Edits } from '../../../support/ruleTable';
import { assessBase, gone, unsettled } from '../../../support/ruleTable';
import {
  soundEnergizedWorksheet,
  soundTestingWorksheet,
  soundWorksheet,
} from '../../../support/soundWorksheet';

describe('the sound worksheets are ready (convention 11)', () => {
  it('circuit off, at every stage', () => {
    const { on, content, proof, closeOut } = soundWorksheet();
    expect(unsettled(assess(content, { on }))).toEqual([]);
    expect(unsettled(assess(content, { on, stage: 'work', proof }))).toEqual([]);
    expect(unsettled(assess(content, { on, stage: 'close-out', proof, closeOut }))).toEqual([]);
  });

  it.each([
    ['testing', soundTestingWorksheet],
    ['energized', soundEnergizedWorksheet],
  ])('%s, at every stage', (_path, build) => {
    const { on, content, closeOut } = build();
    const plan = assess(content, { on });
    expect(unsettled(plan)).toEqual([]);
    // The energized paths have no proof stage: at work they get the rows of the plan.
    expect(assess(content, { on, stage: 'work' })).toEqual(plan);
    expect(unsettled(assess(content, { on, stage: 'close-out', closeOut }))).toEqual([]);
  });

  it.each(SYSTEMS)('circuit off on %s, whole equipment', (system) => {
    const edits: Edits = {
      'supply/system': system,
      'supply/circuitVolts': {
        '208Y/120': 208,
        '480Y/277': 480,
        '120/240': 240,
        '240/120 high-leg': 240,
        '480 delta': 480,
      }[system],
      'supply/exposure': 'whole equipment',
      'supply/readings': gone,
      'supply/conductorColors': gone,
    };
    expect(unsettled(assessBase('O', edits))).toEqual([]);
  });

  it('the plan does not need a proof, and work does', () => {
    const { on, content } = soundWorksheet();
    expect(assess(content, { on, stage: 'plan', proof: {} }).verdict).toBe('ready');
    expect(assess(content, { on, stage: 'work' }).verdict).toBe('open');
  });

  it('cautions never change the verdict', () => {
    const result = assessBase('O');
    expect(result.findings.map(({ severity }) => severity)).toEqual(['caution']);
    expect(result.verdict).toBe('ready');
  });
});

describe('what the edition and the lists say', () => {
  it('names the tasks in the order of the task table', () => {
    expect(TASKS).toEqual(JOB_TASKS);
  });

  it('has twelve briefing topics', () => {
    expect(BRIEFING_TOPICS).toHaveLength(12);
  });

  it('names the edition', () => {
    expect(assessBase('O').edition).toContain('2024');
  });
});
