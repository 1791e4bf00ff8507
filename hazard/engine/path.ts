import { jobTaskFacts } from '../tasks';
import { readAnswers } from './answers';
import type { Answers } from './answers';

/**
 * How the work is done: with the circuit `off`, `testing` it while energized,
 * or any other work while `energized`. Each path has rules of its own.
 */
export type Path = 'off' | 'testing' | 'energized';

/** While the mode is not answered the rules of the off path apply. */
export function pathOfAnswers({ decision, job }: Answers): Path {
  if (decision.mode !== 'energized') return 'off';
  const isTestingTask = job.task !== undefined && jobTaskFacts(job.task).kind === 'testing';
  const isTestingReason =
    decision.reason === 'testing' ||
    (decision.reason === 'infeasible' &&
      decision.infeasibleBecause === 'can only be tested energized');
  return isTestingTask && isTestingReason ? 'testing' : 'energized';
}

/** The path of a worksheet, whatever its content is. */
export function pathOf(content: unknown): Path {
  return pathOfAnswers(readAnswers(content));
}

/**
 * Energized work on parts below 50 V with nothing higher exposed: there is
 * neither a shock nor an arc flash boundary to keep.
 */
export function isBelowFiftyVolts({ decision, supply }: Answers, path: Path): boolean {
  return path === 'energized' && decision.reason === 'below 50 V' && isExtraLowVoltage(supply);
}

export function isExtraLowVoltage(supply: Answers['supply']): boolean {
  return (
    supply.workVolts !== undefined && supply.workVolts < 50 && supply.higherVoltsExposed === false
  );
}
