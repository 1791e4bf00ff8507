import { describe, expect, it } from 'vitest';
import { ARC_FLASH_TASKS, arcFlashLikelihood } from '@/hazard';
import type { ArcFlashTask, Confidence } from '@/hazard';

type Row = readonly [ArcFlashTask, boolean, boolean, Confidence];

describe('arc flash likelihood, NFPA 70E-2024 Table 130.5(C)', () => {
  const rows: readonly Row[] = [
    ['operate device', false, true, 'agreeing'],
    ['open dead-front door', false, true, 'memory'],
    ['cover without exposed parts', false, true, 'memory'],
    ['remove or install breaker', true, true, 'single'],
    ['voltage test', true, true, 'memory'],
    ['remove cover exposing parts', true, true, 'memory'],
    ['energized work on equipment fed from panelboard', true, true, 'memory'],
    ['energized work', true, true, 'memory'],
    ['temporary grounds', true, true, 'memory'],
    ['control circuit up to 125 V', false, false, 'memory'],
    ['thermography or inspection outside restricted', false, false, 'memory'],
    ['read panel meter', false, false, 'memory'],
  ];

  it.each(rows)('%s: normal %s, abnormal %s (%s)', (task, normal, abnormal, confidence) => {
    const ask = (condition: 'normal' | 'abnormal') => arcFlashLikelihood({ task, condition });
    expect(ask('normal')).toMatchObject({ likely: normal, citation: { confidence } });
    expect(ask('abnormal')).toMatchObject({ likely: abnormal, citation: { confidence } });
    expect(ask('normal').citation.table).toBe('Table 130.5(C)');
  });

  it('has a row for every task and none for a task of the job', () => {
    expect(rows.map(([task]) => task)).toEqual([...ARC_FLASH_TASKS]);
    const ask = () =>
      arcFlashLikelihood({ task: 'replace luminaire' as ArcFlashTask, condition: 'normal' });
    expect(ask).toThrow(RangeError);
    expect(ask).toThrow(/^task/);
  });

  it('refuses a condition that is not known', () => {
    const ask = () =>
      arcFlashLikelihood({ task: 'voltage test', condition: 'unknown' as 'normal' });
    expect(ask).toThrow(/^condition/);
  });
});
