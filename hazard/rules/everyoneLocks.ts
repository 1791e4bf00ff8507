import { isAmong } from '../engine/isAmong';
import { answeredValues } from '../engine/read';
import { OFF, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { isOpened, sourceParams } from '../engine/sources';

/**
 * `sources.not-everyone-locked`: each person whose body is on the circuit has a
 * lock of their own on every opened device, or on the group's lock box.
 */
export const everyoneLocks: Rule = {
  code: 'sources.not-everyone-locked',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: OFF,
  citations: ['osha1910.147(f)(3)(ii)(D)'],
  find({ people, sources }) {
    const workers = people.crew.filter(({ worksOnCircuit }) => worksOnCircuit !== false);
    if (workers.length < 2) return [];
    return sources.flatMap((source) => {
      if (!isOpened(source) || source.held === 'exclusive control') return [];
      const locked = answeredValues(source.lockedBy);
      const without = workers.filter(({ id }) => !isAmong(id, locked));
      if (without.length === 0) return [];
      const names = without.map(({ name, id }) => name ?? id ?? '').join(', ');
      return [
        { path: `/sources/${source.index}/lockedBy`, params: { ...sourceParams(source), names } },
      ];
    });
  },
};
