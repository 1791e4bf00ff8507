import { meterIsAdequate } from '../meter';
import { notAnswered, OFF_AND_TESTING, PLAN_AND_WORK } from '../engine/rule';
import type { Hit, Rule } from '../engine/rule';
import { asksAtService } from '../engine/asksAtService';
import { usesMeter } from '../engine/usesMeter';

/**
 * `absence.meter-category`: a meter of too low a category or rating can burn in
 * the hand. Its leads answer to the same marking. What is not answered counts
 * as its best here, so that the rest still stops.
 */
export const meterIsOfItsPlace: Rule = {
  code: 'absence.meter-category',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: OFF_AND_TESTING,
  citations: ['osha1910.334(c)(3)', 'iec61010'],
  find(facts) {
    if (!usesMeter(facts)) return [];
    const { answers, edition, voltage } = facts;
    const { category, ratedVolts } = answers.absenceTest;
    const { atService } = answers.supply;
    const location = atService === true ? 'service' : 'fixed wiring';
    const systemVolts = voltage.atLeastVolts;
    const isAdequate = (one: typeof category, rated: typeof ratedVolts) =>
      meterIsAdequate(
        { category: one ?? 'IV', ratedVolts: rated ?? systemVolts, systemVolts, location },
        edition,
      );
    const hits: Hit[] = [];
    if (category === undefined) hits.push(notAnswered('/absenceTest/category'));
    else if (!isAdequate(category, undefined)) {
      hits.push({ path: '/absenceTest/category', params: { category, location } });
    }
    if (ratedVolts === undefined) hits.push(notAnswered('/absenceTest/ratedVolts'));
    else if (!isAdequate(undefined, ratedVolts)) {
      hits.push({ path: '/absenceTest/ratedVolts', params: { ratedVolts, volts: systemVolts } });
    }
    if (atService === undefined && asksAtService(answers)) {
      hits.push(notAnswered('/supply/atService'));
    }
    return hits;
  },
};
