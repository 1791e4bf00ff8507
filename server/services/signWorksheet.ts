import { v7 } from 'uuid';
import type { Transaction } from 'sequelize';
import type { z } from 'zod';
import type { Meaning, signSchema, WorksheetState } from '@/shared/record';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { QuestionRow } from '../models/QuestionRow';
import { SignatureRow } from '../models/SignatureRow';
import type { User } from '../models/User';
import { Worksheet } from '../models/Worksheet';
import type { WorksheetRevision } from '../models/WorksheetRevision';
import { allows } from '../policies/worksheet';
import { awaitingAcknowledgement } from '../policies/worksheetActions';
import { conflict, hashMismatch, idTaken, notReady, Problem, wrongState } from '../problem';
import { applyRegister } from './applyRegister';
import { assessAt } from './assessAt';
import { changeState } from './changeState';
import { checkPin } from './checkPin';
import { hashOf } from './contentHash';
import { checkDeviceSignature, checkSignedAt } from './deviceSignature';
import { lockWorksheet } from './findWorksheet';
import { notify, supervisorsOf } from './notify';
import { currentRevision } from './readRecord';
import { recordEvent } from './recordEvent';
import { refreshDraft } from './refreshDraft';
import { checkSignatureRelation, loadSigner } from './signatureRelation';
import { placeOf } from './siteOf';
import { isSameContent, verdictColumns } from './writeDraft';

export type SignRequest = z.infer<typeof signSchema>;

interface Signing {
  actor: CurrentUser;
  signer: User;
  request: SignRequest;
  id: string;
}
interface Held {
  worksheet: Worksheet;
  revision: WorksheetRevision;
  signatures: SignatureRow[];
}

/** Where a signature given without signal says when it was given. */
function offlinePart(request: SignRequest) {
  return 'deviceId' in request ? request : null;
}

/** What this signer has already put under this id, if it is the same signature again. */
async function repeatOf({ actor, signer, request, id }: Signing, worksheetId: string) {
  const existing = await SignatureRow.findByPk(id);
  if (existing === null) return null;
  const isSame =
    existing.worksheetId === worksheetId &&
    existing.signerId === signer.id &&
    existing.enteredById === actor.id &&
    existing.meaning === request.meaning &&
    existing.contentHash === request.contentHash;
  if (!isSame) throw idTaken();
  return existing;
}

/** The crew can sign as a whole: everyone has an account, and the lead is named as lead. */
function checkCrewCanSign({ worksheet, revision }: Held): void {
  const crew = revision.content.crew ?? [];
  const strangers = crew.flatMap(({ userId }, index) =>
    userId === undefined
      ? [
          {
            pointer: `#/content/crew/${index}/userId`,
            code: 'no-account',
            message: 'A member without an account cannot sign.',
          },
        ]
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
async function judge({ worksheet, revision }: Held, at: Date, transaction: Transaction) {
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

async function checkQuestions(worksheetId: string, transaction: Transaction): Promise<void> {
  const open = await QuestionRow.count({ where: { worksheetId, answer: null }, transaction });
  if (open > 0) throw conflict('A question of the crew has no answer yet.');
}

/** The state that follows once this signature is among the others. */
function nextState({ worksheet, signatures }: Held): WorksheetState {
  if (worksheet.state === 'countersign') return 'in-force';
  return awaitingAcknowledgement(worksheet, signatures).length > 0 ? 'briefing' : 'countersign';
}

const EVENT_TYPES: Record<Meaning, string> = {
  prepared: 'prepared',
  acknowledged: 'acknowledged',
  countersigned: 'countersigned',
};

/** Who has to know: the next to sign, and whoever signed on another's device. */
async function tellThem(signing: Signing, { worksheet, signatures }: Held, event: Tell) {
  const { transaction } = event;
  const tell = (news: Parameters<typeof notify>[1]['news'], recipientIds: string[]) =>
    notify(transaction, { event: event.event, news, worksheet, recipientIds });
  const { actor, signer } = signing;
  if (actor.id !== signer.id) await tell('acknowledged-for-you', [signer.id]);
  if (worksheet.state === event.from) return;
  if (worksheet.state === 'briefing') {
    await tell('awaits-acknowledgement', awaitingAcknowledgement(worksheet, signatures));
  } else if (worksheet.state === 'countersign') {
    await tell('awaits-countersignature', await supervisorsOf(worksheet, transaction));
  } else if (worksheet.state === 'in-force') {
    await tell('in-force', [worksheet.leadId, ...worksheet.crewIds]);
  }
}
interface Tell {
  transaction: Transaction;
  event: Awaited<ReturnType<typeof changeState>>;
  from: WorksheetState;
}

async function hold(worksheetId: string, transaction: Transaction): Promise<Held> {
  const worksheet = await lockWorksheet(worksheetId, transaction);
  const revision = await currentRevision(worksheet, transaction);
  const where = { worksheetId, revision: worksheet.revision };
  return { worksheet, revision, signatures: await SignatureRow.findAll({ where, transaction }) };
}

function checkAwaited({ worksheet, signatures }: Held, { request, signer }: Signing): void {
  if (!allows(worksheet.state, request.meaning)) throw wrongState(worksheet.state);
  if (signatures.some(({ signerId }) => signerId === signer.id)) {
    throw wrongState(worksheet.state, 'This person has already signed this revision.');
  }
}

function latest(signatures: readonly SignatureRow[]): Date | null {
  const times = signatures.map(({ signedAt }) => signedAt.getTime());
  return times.length === 0 ? null : new Date(Math.max(...times));
}

/** Inserts the signature and moves the worksheet on; the caller has judged everything. */
async function putSignature(
  signing: Signing,
  held: Held & { assessment: ReturnType<typeof assessAt>; signedAt: Date },
  transaction: Transaction,
): Promise<SignatureRow> {
  const { actor, signer, request, id } = signing;
  const { worksheet, revision, signatures, assessment, signedAt } = held;
  if (request.meaning === 'prepared') {
    const { edition } = assessment;
    await revision.update({ assessment, edition }, { transaction });
    worksheet.set(verdictColumns(assessment));
    worksheet.signedCrewIds = [...new Set([...worksheet.signedCrewIds, ...worksheet.crewIds])];
  }
  const offline = offlinePart(request);
  const signature = await SignatureRow.create(
    {
      id,
      worksheetId: worksheet.id,
      revision: worksheet.revision,
      meaning: request.meaning,
      signerId: signer.id,
      signerName: signer.name,
      signerRole: signer.role,
      enteredById: actor.id,
      contentHash: revision.contentHash,
      edition: assessment.edition,
      assessmentHash: hashOf(assessment),
      strokes: request.strokes,
      strokesHash: hashOf(request.strokes),
      method: offline === null ? 'pin' : 'device',
      deviceId: offline?.deviceId ?? null,
      deviceSignature: offline?.signature ?? null,
      signedAt,
      receivedAt: clock.now(),
    },
    { transaction },
  );
  signatures.push(signature);
  const from = worksheet.state;
  const event = await changeState(transaction, {
    worksheet,
    to: nextState({ worksheet, revision, signatures }),
    type: EVENT_TYPES[request.meaning],
    actorId: signer.id,
    enteredById: actor.id,
    payload: {
      signatureId: signature.id,
      contentHash: revision.contentHash,
      signatureHash: signatureHash(signature),
    },
  });
  await tellThem(signing, { worksheet, revision, signatures }, { transaction, event, from });
  return signature;
}

/** Everything that a signature says, for the event that vouches for it. */
export function signatureHash(row: SignatureRow): string {
  return hashOf(JSON.parse(JSON.stringify(row.get({ plain: true }))));
}

function sign(signing: Signing, worksheetId: string): Promise<SignatureRow> {
  const { request } = signing;
  return transact(async (transaction) => {
    const held = await hold(worksheetId, transaction);
    const { worksheet, revision, signatures } = held;
    checkAwaited(held, signing);
    if (revision.contentHash !== request.contentHash) throw hashMismatch(revision.contentHash);
    if (request.meaning === 'prepared') checkCrewCanSign(held);
    const offline = offlinePart(request);
    const signedAt = offline === null ? clock.now() : new Date(offline.signedAt);
    if (offline !== null) {
      const { startsAt, endsAt } = worksheet;
      checkSignedAt({ signedAt, startsAt, endsAt, previous: latest(signatures) });
    }
    const assessment = await judge(held, signedAt, transaction);
    if (request.meaning === 'countersigned') await checkQuestions(worksheetId, transaction);
    return putSignature(signing, { ...held, assessment, signedAt }, transaction);
  });
}

async function checkSigner({ request, signer }: Signing, worksheet: Worksheet): Promise<void> {
  const offline = offlinePart(request);
  if (offline === null) {
    if ('pin' in request) await checkPin(signer.id, request.pin);
    return;
  }
  const { contentHash, meaning, signerId, signedAt, strokes } = offline;
  const { id: worksheetId, revision } = worksheet;
  const strokesHash = hashOf(strokes);
  await checkDeviceSignature(
    offline.deviceId,
    { worksheetId, revision, contentHash, meaning, signerId, signedAt, strokesHash },
    offline.signature,
  );
}

/** A signature given without signal is not lost when it is refused: the trail keeps that it was. */
async function keepRefusal(
  { actor, signer, request, id }: Signing,
  worksheetId: string,
  fault: Problem,
) {
  const offline = offlinePart(request);
  if (offline === null) return;
  await transact(async (transaction) => {
    const worksheet = await lockWorksheet(worksheetId, transaction);
    const { meaning, contentHash } = request;
    const { deviceId, signedAt, signature } = offline;
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'signature-refused',
      actorId: signer.id,
      enteredById: actor.id,
      payload: {
        signatureId: id,
        meaning,
        contentHash,
        deviceId,
        signedAt,
        signature,
        problem: fault.problem,
        detail: fault.message,
        state: worksheet.state,
      },
    });
  });
}

/**
 * Signs the current revision. The PIN or the device's key is checked first;
 * state, hash, register and verdict are judged again in the transaction that
 * inserts the signature, with the worksheet's row held.
 */
export async function signWorksheet(
  actor: CurrentUser,
  worksheet: Worksheet,
  request: SignRequest,
): Promise<{ signature: SignatureRow; created: boolean }> {
  const { meaning, signerId } = request;
  await checkSignatureRelation(actor, { worksheet, meaning, signerId });
  const signer = await loadSigner(signerId);
  const signing = { actor, signer, request, id: request.id ?? v7() };
  try {
    await checkSigner(signing, worksheet);
    const repeat = await repeatOf(signing, worksheet.id);
    if (repeat !== null) return { signature: repeat, created: false };
    if (meaning === 'prepared') await refreshDraft(actor, worksheet.id);
    return { signature: await sign(signing, worksheet.id), created: true };
  } catch (fault) {
    // Two of the same at once: the one that came second finds the first.
    const repeat = isUniqueFault(fault) ? await repeatOf(signing, worksheet.id) : null;
    if (repeat !== null) return { signature: repeat, created: false };
    if (fault instanceof Problem) await keepRefusal(signing, worksheet.id, fault);
    throw fault;
  }
}

function isUniqueFault(fault: unknown): boolean {
  return fault instanceof Error && fault.name === 'SequelizeUniqueConstraintError';
}
