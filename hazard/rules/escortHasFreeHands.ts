import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { personParams } from '../engine/people';
import type { Person } from '../engine/people';

/** Whether someone could escort: qualified, and not with their hands in the panel. */
function hasEscort(crew: readonly Person[]): boolean | undefined {
  const others = crew.filter(({ nearest }) => nearest !== 'restricted');
  const isSure = ({ qualification, nearest }: Person) =>
    qualification === 'yes' && nearest !== undefined;
  if (others.some(isSure)) return true;
  return others.some(({ qualification }) => qualification !== 'no') ? undefined : false;
}

/**
 * `shock.escort-is-working`: an escort is continuous. With the circuit off the
 * helper stays out until it is proved dead.
 */
export const escortHasFreeHands: Rule = {
  code: 'shock.escort-is-working',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.shockApproach', 'own.escort'],
  find({ path: workPath, people: { crew } }) {
    const escort = hasEscort(crew);
    return crew.flatMap((person): Hit[] => {
      if (person.nearest !== 'limited with escort' || escort === true) return [];
      const severity = workPath === 'off' ? 'caution' : escort === undefined ? 'open' : 'stop';
      return [{ path: `/crew/${person.index}/closest`, severity, params: personParams(person) }];
    });
  },
};
