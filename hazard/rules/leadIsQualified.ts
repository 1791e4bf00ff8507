import { ALL, PLAN_AND_WORK } from '../engine/rule';
import type { Rule } from '../engine/rule';
import { personParams } from '../engine/people';

/** `crew.lead-unqualified`: one person leads, and is qualified. */
export const leadIsQualified: Rule = {
  code: 'crew.lead-unqualified',
  severity: 'stop',
  stages: PLAN_AND_WORK,
  appliesTo: ALL,
  citations: ['osha1910.332(b)(3)', 'osha1910.333(c)(2)'],
  find({ people }) {
    const [lead, ...others] = people.crew.filter((person) => person.lead === true);
    if (lead === undefined || others.length > 0) {
      const leads = lead === undefined ? 0 : others.length + 1;
      return [{ path: '/crew', severity: 'open', params: { leads } }];
    }
    if (lead.qualification === 'yes') return [];
    const severity = lead.qualification === 'no' ? 'stop' : 'open';
    return [{ path: `/crew/${lead.index}/qualified`, severity, params: personParams(lead) }];
  },
};
