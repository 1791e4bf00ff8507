import { voltageHits } from '../engine/voltageHits';
import { OFF, PROOF } from '../engine/rule';
import type { Rule } from '../engine/rule';

/** `absence.voltage-present`: what reads 50 V or more is live, whatever was opened. */
export const noVoltageIsRead: Rule = {
  code: 'absence.voltage-present',
  severity: 'stop',
  stages: PROOF,
  appliesTo: OFF,
  citations: ['nfpa70e.electricallySafeWorkCondition'],
  find: ({ readings }) => voltageHits(readings.governing, (volts) => volts >= 50),
};
