import type { StepladderTable } from '../types';

/**
 * How tall a stepladder a ceiling asks for: a rule of thumb. Nobody stands on
 * the top or on the step below it, two feet down.
 */
export const stepladders: StepladderTable = {
  citation: 'practice.stepladder',
  sizesFeet: [4, 6, 8, 10, 12, 14, 16],
  standingBelowTopFeet: 2,
  reachFeet: 6,
  aboveCeilingFeet: 1,
};
