import type { Transaction } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import type { WorksheetState } from '@/shared/record';
import { clock } from '../clock';
import { Device } from '../models/Device';
import type { Event } from '../models/Event';
import { SignatureRow } from '../models/SignatureRow';
import { awaitingAcknowledgement } from '../policies/worksheetActions';
import { changeState } from './changeState';
import { hashOf, hashOfRow } from './contentHash';
import { notify, supervisorsOf } from './notify';
import type { WorksheetNews } from './notify';
import { offlinePart } from './signing';
import type { Held, Signing } from './signing';
import { verdictColumns } from './writeDraft';

/** The state that follows once this signature is among the others. */
function nextState({ worksheet, signatures }: Held): WorksheetState {
  if (worksheet.state === 'countersign') return 'in-force';
  return awaitingAcknowledgement(worksheet, signatures).length > 0 ? 'briefing' : 'countersign';
}

interface Tell {
  transaction: Transaction;
  event: Event;
  from: WorksheetState;
}

/** Who has to know: the next to sign, and whoever signed on another's device. */
async function tellThem(
  { actor, signer }: Signing,
  { worksheet, signatures }: Held,
  { transaction, event, from }: Tell,
): Promise<void> {
  const tell = (news: WorksheetNews, recipientIds: string[]) =>
    notify(transaction, { event, news, worksheet, recipientIds });
  if (actor.id !== signer.id) await tell('acknowledged-for-you', [signer.id]);
  if (worksheet.state === from) return;
  if (worksheet.state === 'briefing') {
    await tell('awaits-acknowledgement', awaitingAcknowledgement(worksheet, signatures));
  } else if (worksheet.state === 'countersign') {
    await tell('awaits-countersignature', await supervisorsOf(worksheet, transaction));
  } else if (worksheet.state === 'in-force') {
    await tell('in-force', [worksheet.leadId, ...worksheet.crewIds]);
  }
}

/** Everything that a signature says, for the event that vouches for it. */
export function signatureHash(row: SignatureRow): string {
  return hashOfRow(row);
}

interface Judged extends Held {
  assessment: Assessment;
  signedAt: Date;
}

function insertSignature(
  { actor, signer, request, id }: Signing,
  { worksheet, revision, assessment, signedAt }: Judged,
  transaction: Transaction,
): Promise<SignatureRow> {
  const offline = offlinePart(request);
  return SignatureRow.create(
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
}

/** Inserts the signature and moves the worksheet on; the caller has judged everything. */
export async function putSignature(
  signing: Signing,
  judged: Judged,
  transaction: Transaction,
): Promise<SignatureRow> {
  const { actor, signer, request } = signing;
  const { worksheet, revision, assessment } = judged;
  if (request.meaning === 'prepared') {
    // Before the signature: from then on the database refuses to change the revision.
    await revision.update({ assessment, edition: assessment.edition }, { transaction });
    worksheet.set(verdictColumns(assessment));
    worksheet.signedCrewIds = [...new Set([...worksheet.signedCrewIds, ...worksheet.crewIds])];
  }
  const signature = await insertSignature(signing, judged, transaction);
  if (signature.deviceId !== null) {
    const where = { id: signature.deviceId };
    await Device.update({ lastUsedAt: signature.receivedAt }, { where, transaction });
  }
  const held = { worksheet, revision, signatures: [...judged.signatures, signature] };
  const from = worksheet.state;
  const event = await changeState(transaction, {
    worksheet,
    to: nextState(held),
    type: request.meaning,
    actorId: signer.id,
    enteredById: actor.id,
    payload: {
      signatureId: signature.id,
      contentHash: revision.contentHash,
      signatureHash: signatureHash(signature),
    },
  });
  await tellThem(signing, held, { transaction, event, from });
  return signature;
}
