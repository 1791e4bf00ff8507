import type { Transaction } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import { QuestionRow } from '../models/QuestionRow';
import { allows } from '../policies/worksheet';
import { conflict, hashMismatch, notReady, wrongState } from '../problem';
import { applyRegister } from './applyRegister';
import { assessAt } from './assessAt';
import type { Held, Signing } from './signing';
import { placeOf } from './placeOf';
import { isSameContent } from './writeDraft';

/** The state awaits this meaning, and nobody signs a revision twice. */
export function checkAwaited({ worksheet, signatures }: Held, { request, signer }: Signing): void {
  if (!allows(worksheet.state, request.meaning)) throw wrongState(worksheet.state);
  if (signatures.some(({ signerId }) => signerId === signer.id)) {
    throw wrongState(worksheet.state, 'This person has already signed this revision.');
  }
}

/** The crew can sign as a whole: everyone has an account, and the lead is named as lead. */
export function checkCrewCanSign({ worksheet, revision }: Held): void {
  const crew = revision.content.crew ?? [];
  const message = 'A member without an account cannot sign.';
  const strangers = crew.flatMap(({ userId }, index) =>
    userId === undefined
      ? [{ pointer: `#/content/crew/${index}/userId`, code: 'no-account', message }]
      : [],
  );
  if (strangers.length > 0) {
    throw conflict('Someone on the crew has no account and cannot sign.', strangers);
  }
  if (!crew.some(({ userId, lead }) => userId === worksheet.leadId && lead === true)) {
    throw conflict('The crew does not name the lead of this worksheet as lead.', [
      { pointer: '#/content/crew', code: 'lead-not-named', message: 'The lead is not named.' },
    ]);
  }
}

/** What is signed must still be what the register says, and be ready at that moment. */
export async function judge(
  { worksheet, revision }: Held,
  at: Date,
  transaction: Transaction,
): Promise<Assessment> {
  const { timeZone } = await placeOf(worksheet, transaction);
  const { leadId } = worksheet;
  const answer = await applyRegister({ content: revision.content, leadId }, transaction);
  if (answer.errors.length > 0) {
    throw conflict('The register no longer holds what this worksheet names.', answer.errors);
  }
  const assessment = assessAt({ content: answer.content, at, timeZone });
  if (assessment.verdict !== 'ready') throw notReady(assessment.findings);
  if (!isSameContent(revision.content, answer.content)) throw hashMismatch(revision.contentHash);
  return assessment;
}

/** An open question blocks the countersignature, and nothing else. */
export async function checkQuestions(worksheetId: string, transaction: Transaction): Promise<void> {
  const open = await QuestionRow.count({ where: { worksheetId, answer: null }, transaction });
  if (open > 0) throw conflict('A question of the crew has no answer yet.');
}
