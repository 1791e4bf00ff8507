import type { Edits } from './ruleTable';
import { gone } from './ruleTable';

/** Within the window of the sound worksheets, and before its `on`. */
export const READ_AT = '2026-12-01T08:50:00-06:00';

/** The W path's exception: nothing of 50 V or more is exposed. */
export const BELOW_FIFTY: Edits = {
  'decision/reason': 'below 50 V',
  'supply/workVolts': 24,
  'supply/higherVoltsExposed': false,
};

/** An inspection from outside, covers on: nobody is restricted, no arc flash is likely. */
export const FAR: Edits = {
  'job/task': 'inspect',
  'arcFlash/task': 'thermography or inspection outside restricted',
  'crew/0/closest': 'outside all boundaries',
};

/** A 277 V circuit, without readings and colors of another system. */
export const CIRCUIT_277: Edits = {
  'supply/system': '480Y/277',
  'supply/circuitVolts': 277,
  'supply/readings': gone,
  'supply/conductorColors': gone,
};

/** The helper made a qualified person. */
export const SECOND_QUALIFIED: Edits = {
  'crew/1/qualified': true,
  'crew/1/qualifiedThrough': '2028-01-01',
};

/** How a listed source is opened and held. */
export const HELD_BY_LEAD = {
  openedAt: 'breaker',
  held: 'lock and tag',
  lockNumber: '12',
  lockedBy: ['c1'],
  byCrewId: 'c1',
};

/** A set of gloves in test. */
export const GLOVE_SET = {
  gloveClass: '0',
  lastTestedOn: '2026-09-01',
  issuedOn: '2026-08-01',
  airTested: true,
  leatherProtectors: true,
};

export const BATTERY_UNIT = {
  id: 'b1',
  kind: 'battery unit',
  from: 'Unit over door 1',
  openedAt: 'battery connector',
  held: 'exclusive control',
  byCrewId: 'c1',
};

/** A second circuit at the first point of work, on conductors of its own. */
export const UNSWITCHED_HOT = {
  id: 'h1',
  kind: 'unswitched hot',
  from: 'LA-1 ckt 9',
  points: ['A1'],
  openedAt: 'breaker',
  held: 'lock and tag',
  lockNumber: '13',
  lockedBy: ['c1'],
  byCrewId: 'c1',
};

/** A reading of a pair that the sound worksheet has read at 0 V already. */
export const readingOf = (volts: unknown, others: object = {}) => ({
  point: 'A1',
  from: 'B',
  to: 'G',
  volts,
  current: 'ac',
  at: READ_AT,
  ...others,
});
