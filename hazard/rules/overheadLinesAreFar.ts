import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `surroundings.overhead-line`: 10 ft to lines of up to 50 kV, for person, lift, pole and ladder. */
export const overheadLinesAreFar: Rule = {
  code: 'surroundings.overhead-line',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.333(c)(3)'],
  find({ answers }) {
    const { outdoors, overheadLines } = answers.surroundings;
    const path = '/surroundings/overheadLines';
    if (outdoors === undefined) return [notAnswered('/surroundings/outdoors')];
    if (!outdoors) return [];
    if (overheadLines === undefined) return [notAnswered(path)];
    return overheadLines === 'nearer than 10 ft' ? [{ path }] : [];
  },
};
