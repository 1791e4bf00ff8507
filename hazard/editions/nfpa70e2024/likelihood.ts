import type { Edition, LikelihoodRow } from '../types';

const never: LikelihoodRow = {
  likely: { normal: false, abnormal: false },
  citation: 'nfpa70e.likelihood',
};
const whenAbnormal: LikelihoodRow = {
  likely: { normal: false, abnormal: true },
  citation: 'nfpa70e.likelihood',
};
const always: LikelihoodRow = {
  likely: { normal: true, abnormal: true },
  citation: 'nfpa70e.likelihood',
};

/**
 * Whether an arc flash is likely, by task and condition of the equipment
 * (NFPA 70E-2024 Table 130.5(C)). "Not likely" is not "impossible". The table
 * has no row for replacing a luminaire, so none is invented here.
 */
export const likelihood: Edition['likelihood'] = {
  'operate device': { ...whenAbnormal, citation: 'nfpa70e.likelihoodOperateDevice' },
  'open dead-front door': whenAbnormal,
  'cover without exposed parts': whenAbnormal,
  'remove or install breaker': { ...always, citation: 'nfpa70e.likelihoodBreaker' },
  'voltage test': always,
  'remove cover exposing parts': always,
  'energized work on equipment fed from panelboard': always,
  'energized work': always,
  'temporary grounds': always,
  'control circuit up to 125 V': never,
  'thermography or inspection outside restricted': never,
  'read panel meter': never,
};
