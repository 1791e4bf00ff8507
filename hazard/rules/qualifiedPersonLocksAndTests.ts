import { qualificationOfId } from '../engine/people';
import { notAnswered, OFF_AND_TESTING, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { sourceParams } from '../engine/sources';
import { usesMeter } from '../engine/usesMeter';

/**
 * `sources.by-unqualified`: a qualified person tests, and on this tool also
 * applies our lock. Someone who is not in the crew is nobody known.
 */
export const qualifiedPersonLocksAndTests: Rule = {
  code: 'sources.by-unqualified',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF_AND_TESTING,
  citations: ['osha1910.333(b)(2)(iv)(B)', 'osha1910.334(c)(1)', 'own.qualifiedOpens'],
  find(facts) {
    const { answers, path, people, sources } = facts;
    const judge = (id: string | undefined, at: string, basis: Partial<Hit>): Hit[] => {
      if (id === undefined) return [{ ...basis, ...notAnswered(at, basis.params) }];
      const qualification = qualificationOfId(id, people, answers.crew.isAnswered);
      if (qualification === 'yes') return [];
      const severity = qualification === 'no' ? 'stop' : 'open';
      const name = people.crew.find((person) => person.id === id)?.name;
      const params = { ...basis.params, ...(name === undefined ? {} : { name }) };
      return [{ ...basis, path: at, severity, params }];
    };
    const lockers =
      path === 'off'
        ? sources.flatMap((source) =>
            judge(source.byCrewId, `/sources/${source.index}/byCrewId`, {
              citation: 'own.qualifiedOpens',
              params: sourceParams(source),
            }),
          )
        : [];
    const tester = usesMeter(facts)
      ? judge(answers.absenceTest.byCrewId, '/absenceTest/byCrewId', {})
      : [];
    return [...lockers, ...tester];
  },
};
