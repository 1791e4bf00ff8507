import { citation } from '../citations';
import type { CitationId } from '../citations';
import type { Edition } from '../editions/types';
import type { Permit } from '../types';
import type { Answers } from './answers';
import type { ArcFacts } from './arc';
import type { Path } from './path';
import type { People } from './people';

/** Why an energized work permit is required or not; the words are in `shared/messages`. */
export const PERMIT_REASONS = [
  'absence test',
  'testing',
  'inspection outside restricted',
  'inside restricted',
  'arc flash likely',
  'below 50 V',
  'nobody inside',
] as const;
export type PermitReason = (typeof PERMIT_REASONS)[number];

/** The exemptions of 70E-2024 130.2(C) that are used. Exempt from the permit is never exempt from protection. */
export const PERMIT_EXEMPTIONS = ['130.2(C)(1)', '130.2(C)(2)'] as const;
export type PermitExemption = (typeof PERMIT_EXEMPTIONS)[number];

interface Question {
  answers: Answers;
  path: Path;
  people: People;
  arc: ArcFacts;
  isBelowFiftyVolts: boolean;
}

/** Someone is restricted, or nothing says that they are not. */
function mayBeInside({ people }: Question): boolean {
  const { crew, someoneEnters } = people;
  return someoneEnters || crew.length === 0 || crew.some(({ nearest }) => nearest === undefined);
}

function reasonOf(question: Question): {
  because: PermitReason;
  exemption: PermitExemption | null;
  basis: CitationId;
} {
  const { answers, path, people, arc, isBelowFiftyVolts } = question;
  const exempt = { exemption: '130.2(C)(1)', basis: 'nfpa70e.permitExemptTesting' } as const;
  if (path === 'off') return { because: 'absence test', ...exempt };
  if (path === 'testing') {
    const isInspection = answers.job.task === 'inspect' || answers.job.task === 'thermography';
    const isOutside = !people.someoneEnters && answers.arcFlash.coversOn === true;
    if (!isInspection || !isOutside) return { because: 'testing', ...exempt };
    return {
      because: 'inspection outside restricted',
      exemption: '130.2(C)(2)',
      basis: 'nfpa70e.permitExemptInspection',
    };
  }
  const basis = 'nfpa70e.permit';
  if (isBelowFiftyVolts) return { because: 'below 50 V', exemption: null, basis };
  if (mayBeInside(question)) return { because: 'inside restricted', exemption: null, basis };
  return { because: arc.likely ? 'arc flash likely' : 'nobody inside', exemption: null, basis };
}

/** Whether an energized work permit is required (70E 130.2). Subpart S names no permit. */
export function permitOf(question: Question, edition: Edition): Permit {
  const { because, exemption, basis } = reasonOf(question);
  return {
    required: because === 'inside restricted' || because === 'arc flash likely',
    exemption,
    because,
    citation: citation(basis, edition),
  };
}
