import { describe, expect, it } from 'vitest';
import { assess, RULE_CODES } from '@/hazard';
import { rules } from '@/hazard/rules';
import { BROKEN_PLANS } from '../support/brokenWorksheets';
import { withEdits } from '../support/ruleTable';

describe('the broken worksheets that the screens are tried with', () => {
  it('provoke every rule of the plan', () => {
    const provoked = new Set(
      BROKEN_PLANS.flatMap(([, base, edits]) => {
        const { content, on } = withEdits(base, edits);
        return assess(content, { on }).findings.map(({ code }) => code);
      }),
    );
    const ofThePlan = rules.filter(({ stages }) => stages.includes('plan')).map(({ code }) => code);
    expect(ofThePlan.filter((code) => !provoked.has(code))).toEqual([]);
    expect(RULE_CODES).toEqual(expect.arrayContaining(ofThePlan));
  });
});
