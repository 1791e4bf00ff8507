import { v7 } from 'uuid';
import type { z } from 'zod';
import type { closeSchema } from '@/shared/record';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { AttachmentRow } from '../models/AttachmentRow';
import { CloseOutRow } from '../models/CloseOutRow';
import { ProofRow } from '../models/ProofRow';
import type { Worksheet } from '../models/Worksheet';
import { notReady } from '../problem';
import { assessAt } from './assessAt';
import { actOnce, changeState } from './changeState';
import { checkPin } from './checkPin';
import { hashOf, hashOfRow } from './contentHash';
import { currentRevision } from './readRecord';
import { placeOf } from './placeOf';

type Photo = Pick<AttachmentRow, 'id' | 'sha256'>;

/** What the event of a close-out vouches for: the record and its photos. */
export function closeOutHash(row: CloseOutRow, photos: readonly Photo[]): string {
  return hashOf({
    record: hashOfRow(row),
    photos: photos
      .map(({ id, sha256 }) => ({ id, sha256 }))
      .sort((one, other) => (one.id < other.id ? -1 : 1)),
  });
}

/** The lead records how the job ended. From then on the worksheet is in the archive. */
export async function closeWorksheet(
  actor: CurrentUser,
  { id: worksheetId }: Worksheet,
  { id, closeOut, pin }: z.infer<typeof closeSchema>,
): Promise<Worksheet> {
  await checkPin(actor.id, pin);
  return actOnce(actor, { worksheetId, act: 'close', id }, async (worksheet, transaction) => {
    const { content } = await currentRevision(worksheet, transaction);
    const { timeZone } = await placeOf(worksheet, transaction);
    const proof = await ProofRow.findOne({
      where: { worksheetId, revision: worksheet.revision },
      order: [
        ['at', 'DESC'],
        ['id', 'DESC'],
      ],
      transaction,
    });
    const at = clock.now();
    const stage = 'close-out' as const;
    const assessment = assessAt({ content, at, timeZone, stage, proof: proof?.proof, closeOut });
    if (assessment.verdict !== 'ready') throw notReady(assessment.findings);
    const row = await CloseOutRow.create(
      {
        id: v7(),
        worksheetId,
        revision: worksheet.revision,
        closeOut,
        assessment,
        byId: actor.id,
        byName: actor.name,
        at,
      },
      { transaction },
    );
    const photos = await AttachmentRow.findAll({
      where: { worksheetId, section: 'closeOut' },
      transaction,
    });
    await changeState(transaction, {
      worksheet,
      to: 'closed',
      type: 'closed',
      actorId: actor.id,
      payload: { closeOutId: row.id, closeOutHash: closeOutHash(row, photos) },
    });
  });
}
