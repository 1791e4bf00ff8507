import type { CurrentUser } from '../currentUser';
import type { SignatureRow } from '../models/SignatureRow';
import type { Worksheet } from '../models/Worksheet';
import {
  allows,
  isCrew,
  isLead,
  mayCopy,
  mayCountersign,
  mayReturn,
  maySign,
  mayStop,
  mayVoid,
} from './worksheet';

/** Crew members with an account, the lead aside, who have not acknowledged this revision. */
export function awaitingAcknowledgement(
  { crewIds, leadId }: Pick<Worksheet, 'crewIds' | 'leadId'>,
  signatures: readonly Pick<SignatureRow, 'meaning' | 'signerId'>[],
): string[] {
  const signed = new Set(signatures.map(({ signerId }) => signerId));
  return crewIds.filter((id) => id !== leadId && !signed.has(id));
}

interface Standing {
  worksheet: Worksheet;
  signatures: readonly Pick<SignatureRow, 'meaning' | 'signerId'>[];
  hasOpenQuestion: boolean;
}

/**
 * What the asking person may do now, by relation and state. A verdict that is
 * not ready does not take an act from the list: the answer names the findings.
 */
export function worksheetActions(
  person: CurrentUser,
  { worksheet, signatures, hasOpenQuestion }: Standing,
): string[] {
  const { state, mode } = worksheet;
  const lead = isLead(person, worksheet);
  const crew = isCrew(person, worksheet);
  const awaited = awaitingAcknowledgement(worksheet, signatures).length > 0;
  const all: [string, boolean][] = [
    ['save', lead && allows(state, 'save')],
    ['attach', lead && allows(state, 'attach')],
    ['attach:closeOut', lead && allows(state, 'attachToCloseOut')],
    ['sign:prepared', lead && allows(state, 'prepared')],
    ['sign:acknowledged', crew && awaited && allows(state, 'acknowledged')],
    [
      'sign:countersigned',
      maySign(person, worksheet) &&
        mayCountersign(person, worksheet) &&
        allows(state, 'countersigned'),
    ],
    ['prove', lead && mode === 'off' && allows(state, 'prove')],
    ['ask', crew && allows(state, 'ask')],
    ['answer', lead && hasOpenQuestion && allows(state, 'answer')],
    ['return', mayReturn(person, worksheet) && allows(state, 'return')],
    ['stop', mayStop(person, worksheet) && allows(state, 'stop')],
    ['void', mayVoid(person, worksheet) && allows(state, 'void')],
    ['revise', lead && allows(state, 'revise')],
    ['close', lead && allows(state, 'close')],
    ['copy', mayCopy(person, worksheet)],
  ];
  return all.filter(([, may]) => may).map(([act]) => act);
}
