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
