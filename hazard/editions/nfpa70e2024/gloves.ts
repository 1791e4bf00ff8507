import type { GloveTable } from '../types';

/**
 * Rubber insulating gloves: the highest alternating voltage of use (29 CFR
 * 1910.137 Table I-4) and the months between tests (Table I-5). A glove that
 * lay unissued for more than twelve months since its test is not put in service.
 */
export const gloves: GloveTable = {
  useCitation: 'osha1910.137.tableI-4',
  testCitation: 'osha1910.137.tableI-5',
  maxUseVolts: { '00': 500, '0': 1000, '1': 7500, '2': 17_000, '3': 26_500, '4': 36_000 },
  testEveryMonths: 6,
  issueWithinMonthsOfTest: 12,
};
