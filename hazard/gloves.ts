import { requireNumber, requireOneOf } from './arguments';
import { citation } from './citations';
import { addCalendarMonths, requireCalendarDate } from './dates';
import { nfpa70e2024 } from './editions';
import type { Edition } from './editions/types';
import { GLOVE_CLASSES } from './enumerations';
import type { GloveClass } from './enumerations';
import type { Citation } from './types';

/** The lowest class of rubber glove that is enough; none is above 36 000 V. */
export function selectGloveClass(
  volts: number,
  edition: Edition = nfpa70e2024,
): { gloveClass: GloveClass; maxUseVolts: number; citation: Citation } {
  requireNumber('volts', volts);
  const { maxUseVolts, useCitation } = edition.gloves;
  const gloveClass = GLOVE_CLASSES.find((candidate) => volts <= maxUseVolts[candidate]);
  if (gloveClass === undefined) {
    throw new RangeError(`volts must be within a glove class, not ${volts}`);
  }
  return {
    gloveClass,
    maxUseVolts: maxUseVolts[gloveClass],
    citation: citation(useCitation, edition),
  };
}

interface GloveQuestion {
  gloveClass: GloveClass;
  lastTestedOn: string;
  issuedOn?: string | undefined;
  on: string;
  volts: number;
}

/**
 * Whether a pair of gloves is enough for a voltage and in test on a day. All
 * dates are `YYYY-MM-DD`.
 *
 * The six months run from the test, or from the issue of gloves that lay on
 * the shelf since their test. Those must be issued within twelve months of it
 * and never go past them.
 */
export function gloveStatus(
  { gloveClass, lastTestedOn, issuedOn, on, volts }: GloveQuestion,
  edition: Edition = nfpa70e2024,
): { adequate: boolean; inTest: boolean; dueOn: string } {
  const { maxUseVolts, testEveryMonths, issueWithinMonthsOfTest } = edition.gloves;
  requireOneOf('gloveClass', gloveClass, GLOVE_CLASSES);
  requireNumber('volts', volts);
  requireCalendarDate('lastTestedOn', lastTestedOn);
  requireCalendarDate('on', on);
  if (issuedOn !== undefined) requireCalendarDate('issuedOn', issuedOn);

  const adequate = volts <= maxUseVolts[gloveClass];
  if (issuedOn === undefined || issuedOn <= lastTestedOn) {
    const dueOn = addCalendarMonths(lastTestedOn, testEveryMonths);
    return { adequate, inTest: lastTestedOn <= on && on <= dueOn, dueOn };
  }
  // Issued after the test, so a test after `on` would mean an issue after `on` too; and gloves
  // issued after the shelf time ends are in test on no day, since they are due before it.
  const shelfEndsOn = addCalendarMonths(lastTestedOn, issueWithinMonthsOfTest);
  const afterIssue = addCalendarMonths(issuedOn, testEveryMonths);
  const dueOn = afterIssue < shelfEndsOn ? afterIssue : shelfEndsOn;
  return { adequate, inTest: issuedOn <= on && on <= dueOn, dueOn };
}
