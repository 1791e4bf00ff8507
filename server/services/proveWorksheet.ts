import { v7 } from 'uuid';
import type { Assessment } from '@/hazard/types';
import type { Proof } from '@/shared/worksheet';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { ProofRow } from '../models/ProofRow';
import type { Worksheet } from '../models/Worksheet';
import { conflict, idTaken } from '../problem';
import { assessAt } from './assessAt';
import { actOn, changeState } from './changeState';
import { checkPin } from './checkPin';
import { hashOf, hashOfRow } from './contentHash';
import { notify, supervisorsOf } from './notify';
import { currentRevision } from './readRecord';
import { recordEvent } from './recordEvent';
import { placeOf } from './placeOf';
import { metColumns } from './writeDraft';

interface NewProof {
  id?: string | undefined;
  proof: Proof;
  pin: string;
}

/** A governing reading of 50 V or more: what was thought dead is live. */
const VOLTAGE_PRESENT = 'absence.voltage-present';

async function repeatOf(actor: CurrentUser, worksheetId: string, id: string, proof: Proof) {
  const existing = await ProofRow.findByPk(id);
  if (existing === null) return null;
  const isSame =
    existing.worksheetId === worksheetId &&
    existing.byId === actor.id &&
    hashOf(existing.proof) === hashOf(proof);
  if (!isSame) throw idTaken();
  return existing;
}

/** Everything that a proof says, for the event that vouches for it. */
export function proofHash(row: ProofRow): string {
  return hashOfRow(row);
}

function stopReason(assessment: Assessment): string | null {
  const found = assessment.findings.some(({ code }) => code === VOLTAGE_PRESENT);
  return found ? 'still live' : null;
}

function insertProof(actor: CurrentUser, worksheetId: string, id: string, proof: Proof) {
  return actOn(worksheetId, 'prove', async (worksheet, transaction) => {
    if (worksheet.mode !== 'off') {
      throw conflict('Work on the energized path is in force without a proof.');
    }
    const { content } = await currentRevision(worksheet, transaction);
    const { timeZone } = await placeOf(worksheet, transaction);
    const at = clock.now();
    const assessment = assessAt({ content, at, timeZone, stage: 'work', proof });
    const row = await ProofRow.create(
      {
        id,
        worksheetId,
        revision: worksheet.revision,
        proof,
        assessment,
        byId: actor.id,
        byName: actor.name,
        at,
      },
      { transaction },
    );
    const met = assessment.findings.filter(({ severity }) => severity !== 'caution');
    worksheet.set({
      proved: assessment.verdict === 'ready',
      ...metColumns(worksheet, met),
      updatedAt: at,
    });
    await worksheet.save({ transaction });
    await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'proof-recorded',
      actorId: actor.id,
      payload: {
        proofId: id,
        proofHash: proofHash(row),
        verdict: assessment.verdict,
        proved: worksheet.proved,
        state: worksheet.state,
      },
    });
    const reason = stopReason(assessment);
    if (reason !== null) {
      const event = await changeState(transaction, {
        worksheet,
        to: 'stopped',
        type: 'stopped',
        actorId: actor.id,
        reason,
        payload: { proofId: id },
      });
      const supervisors = await supervisorsOf(worksheet, transaction);
      const recipientIds = [worksheet.leadId, ...worksheet.crewIds, ...supervisors];
      await notify(transaction, { event, news: 'stopped', worksheet, recipientIds, reason });
    }
    return row;
  });
}

/**
 * Records a test for absence of voltage on a worksheet in force. Proofs are
 * only ever added; the latest one counts. 50 V or more stops the worksheet.
 */
export async function proveWorksheet(
  actor: CurrentUser,
  worksheet: Worksheet,
  { id = v7(), proof, pin }: NewProof,
): Promise<{ row: ProofRow; created: boolean }> {
  await checkPin(actor.id, pin);
  const earlier = await repeatOf(actor, worksheet.id, id, proof);
  if (earlier !== null) return { row: earlier, created: false };
  try {
    return { row: await insertProof(actor, worksheet.id, id, proof), created: true };
  } catch (fault) {
    // Two of the same at once: the one that came second finds the first.
    const repeat = await repeatOf(actor, worksheet.id, id, proof);
    if (repeat === null) throw fault;
    return { row: repeat, created: false };
  }
}
