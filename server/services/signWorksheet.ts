import { v7 } from 'uuid';
import type { Transaction } from 'sequelize';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { transact } from '../db';
import { SignatureRow } from '../models/SignatureRow';
import type { Worksheet } from '../models/Worksheet';
import { hashMismatch, idTaken, Problem } from '../problem';
import { checkPin } from './checkPin';
import { hashOf } from './contentHash';
import { checkDeviceSignature, checkSignedAt } from './deviceSignature';
import { lockWorksheet } from './findWorksheet';
import { putSignature } from './putSignature';
import { currentRevision } from './readRecord';
import { recordEvent } from './recordEvent';
import { refreshDraft } from './refreshDraft';
import { checkSignatureRelation, loadSigner } from './signatureRelation';
import { offlinePart } from './signing';
import type { Held, Signing, SignRequest } from './signing';
import { checkAwaited, checkCrewCanSign, checkQuestions, judge } from './signingChecks';

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

async function hold(worksheetId: string, transaction: Transaction): Promise<Held> {
  const worksheet = await lockWorksheet(worksheetId, transaction);
  const revision = await currentRevision(worksheet, transaction);
  const where = { worksheetId, revision: worksheet.revision };
  return { worksheet, revision, signatures: await SignatureRow.findAll({ where, transaction }) };
}

function latest(signatures: readonly SignatureRow[]): Date | null {
  const times = signatures.map(({ signedAt }) => signedAt.getTime());
  return times.length === 0 ? null : new Date(Math.max(...times));
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
): Promise<void> {
  const offline = offlinePart(request);
  if (offline === null) return;
  const { meaning, contentHash, deviceId, signedAt, signature } = offline;
  await transact(async (transaction) => {
    const { revision, state } = await lockWorksheet(worksheetId, transaction);
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision,
      type: 'signature-refused',
      actorId: signer.id,
      enteredById: actor.id,
      payload: {
        ...{ signatureId: id, meaning, contentHash, deviceId, signedAt, signature, state },
        problem: fault.problem,
        detail: fault.message,
      },
    });
  });
}

/**
 * Signs the current revision. The PIN or the device's key is checked first;
 * state, hash, register and verdict are judged in the transaction that inserts
 * the signature, with the worksheet's row held.
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
    const earlier = await repeatOf(signing, worksheet.id);
    if (earlier !== null) return { signature: earlier, created: false };
    if (meaning === 'prepared') await refreshDraft(actor, worksheet.id);
    return { signature: await sign(signing, worksheet.id), created: true };
  } catch (fault) {
    // Of two of the same at once, the one that comes second finds the first.
    const isWrongPerson = fault instanceof Problem && fault.status === 403;
    const repeat = isWrongPerson ? null : await repeatOf(signing, worksheet.id);
    if (repeat !== null) return { signature: repeat, created: false };
    if (fault instanceof Problem) await keepRefusal(signing, worksheet.id, fault);
    throw fault;
  }
}
