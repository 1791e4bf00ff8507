import { voltageHits } from '../engine/voltageHits';
import { OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** Above this a reading is not the noise of a meter: common practice. */
const STRAY_ABOVE_VOLTS = 3;

/**
 * `absence.stray-voltage`: induced voltage or backfeed. Its source is found, or
 * a low-impedance meter shows that nothing stands behind it.
 */
export const noStrayVoltageIsLeft: Rule = {
  code: 'absence.stray-voltage',
  severity: 'stop',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['osha1910.333(b)(2)(iv)(B)', 'practice.strayVoltage'],
  find: ({ readings }) =>
    voltageHits(readings.governing, (volts) => volts > STRAY_ABOVE_VOLTS && volts < 50),
};
