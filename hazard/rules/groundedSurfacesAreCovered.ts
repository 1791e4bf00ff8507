import { ALL, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';

/**
 * `shock.grounded-surface`: whoever leans on grounded metal closes the circuit
 * through the chest. While nothing but gloved hands and probes goes in it may
 * be kept clear; for energized work it is covered. A lift that does not
 * insulate is such a surface.
 */
export const groundedSurfacesAreCovered: Rule = {
  code: 'shock.grounded-surface',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['osha1910.333(a)(2)', 'osha1910.335(a)(2)(ii)', 'practice.groundedSurfaces'],
  find({ answers, path: workPath }) {
    const { access, groundedSurfaces, lift } = answers.surroundings;
    const path = '/surroundings/groundedSurfaces';
    const hits: Hit[] = groundedSurfaces.isAnswered ? [] : [notAnswered(path)];
    groundedSurfaces.values.forEach(({ kind, inReach, covered, keptClear }, index) => {
      const isKeptClear = workPath !== 'energized' && keptClear === true;
      if (inReach === false || covered === true || isKeptClear) return;
      hits.push({ path: `${path}/${index}`, params: { index, ...(kind && { kind }) } });
    });
    if (workPath === 'energized' && access === 'lift' && lift.insulating !== true) {
      hits.push({ path: '/surroundings/access', params: { kind: 'lift' } });
    }
    return hits;
  },
};
