import { ENERGIZED, notAnswered, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import type { Facts } from '../engine/facts';

const comparable = (text: string) => text.trim().toLowerCase();

function isOfCrew(approvedBy: string, { people }: Facts): boolean {
  const name = comparable(approvedBy);
  return people.crew.some((person) =>
    [person.id, person.userId, person.name].some(
      (one) => one !== undefined && comparable(one) === name,
    ),
  );
}

/**
 * `permit.missing`: a permit is required, covers the whole window, and is given
 * by someone who does not do the work.
 */
export const permitIsGiven: Rule = {
  code: 'permit.missing',
  severity: 'open',
  stages: PLAN_AND_WORK,
  appliesTo: ENERGIZED,
  appliesBelowFiftyVolts: false,
  citations: ['nfpa70e.permit', 'own.permitApprover'],
  find(facts) {
    const { answers, permit } = facts;
    if (!permit.required) return [];
    const { number, approvedBy, validUntil } = answers.decision.permit;
    const { endsAt } = answers.job;
    const path = '/decision/permit';
    const hits: Hit[] = [];
    if (number === undefined) hits.push(notAnswered(`${path}/number`));
    if (approvedBy === undefined) hits.push(notAnswered(`${path}/approvedBy`));
    else if (isOfCrew(approvedBy, facts)) {
      hits.push({
        path: `${path}/approvedBy`,
        severity: 'stop',
        params: { name: approvedBy },
        citation: 'own.permitApprover',
      });
    }
    if (validUntil === undefined) hits.push(notAnswered(`${path}/validUntil`));
    else if (endsAt !== undefined && validUntil.instant < endsAt.instant) {
      hits.push({
        path: `${path}/validUntil`,
        severity: 'stop',
        params: { validUntil: validUntil.text, endsAt: endsAt.text },
      });
    }
    return hits;
  },
};
