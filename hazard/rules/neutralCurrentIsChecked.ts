import { notAnswered, OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** The most that a clamp shows on a neutral that carries nothing, in amperes. */
const NO_CURRENT_AMPERES = 0.1;

/**
 * `sources.neutral-not-checked`: the neutral is clamped before it is parted.
 * The absence test cannot see a shared one: N to G reads zero until it opens.
 */
export const neutralCurrentIsChecked: Rule = {
  code: 'sources.neutral-not-checked',
  severity: 'stop',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['practice.neutral', 'nec300.13(B)', 'nec210.4(B)'],
  find({ answers, asksNeutralCurrent, proof }) {
    if (!asksNeutralCurrent) return [];
    const path = '/proof/neutralAmperes';
    const { neutralAmperes } = proof;
    if (neutralAmperes === undefined) {
      return answers.supply.neutralShared === 'no' ? [] : [notAnswered(path)];
    }
    if (neutralAmperes <= NO_CURRENT_AMPERES) return [];
    return [{ path, params: { amperes: neutralAmperes, limit: NO_CURRENT_AMPERES } }];
  },
};
