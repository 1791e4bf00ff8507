import { v7 } from 'uuid';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { QuestionRow } from '../models/QuestionRow';
import type { Worksheet } from '../models/Worksheet';
import { idTaken } from '../problem';
import { actOn } from './changeState';
import { sha256 } from './contentHash';
import { notify } from './notify';
import { recordEvent } from './recordEvent';

interface NewQuestion {
  id?: string | undefined;
  text: string;
}

async function repeatOf(actor: CurrentUser, worksheetId: string, id: string) {
  const existing = await QuestionRow.findByPk(id);
  if (existing === null) return null;
  if (existing.worksheetId !== worksheetId || existing.askedById !== actor.id) throw idTaken();
  return existing;
}

function insertQuestion(actor: CurrentUser, worksheetId: string, id: string, text: string) {
  return actOn(worksheetId, 'ask', async (worksheet, transaction) => {
    const row = await QuestionRow.create(
      {
        id,
        worksheetId,
        revision: worksheet.revision,
        text,
        askedById: actor.id,
        askedAt: clock.now(),
        answerId: null,
        answer: null,
        answeredById: null,
        answeredAt: null,
      },
      { transaction },
    );
    const event = await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: worksheetId,
      revision: worksheet.revision,
      type: 'asked',
      actorId: actor.id,
      payload: { questionId: id, textHash: sha256(text), state: worksheet.state },
    });
    const recipientIds = [worksheet.leadId].filter((person) => person !== actor.id);
    await notify(transaction, { event, news: 'asked', worksheet, recipientIds });
    return row;
  });
}

/** A member of the crew asks; until the lead answers nobody countersigns. */
export async function askQuestion(
  actor: CurrentUser,
  worksheet: Worksheet,
  { id = v7(), text }: NewQuestion,
): Promise<{ row: QuestionRow; created: boolean }> {
  const earlier = await repeatOf(actor, worksheet.id, id);
  if (earlier !== null) return { row: earlier, created: false };
  try {
    return { row: await insertQuestion(actor, worksheet.id, id, text), created: true };
  } catch (fault) {
    const repeat = await repeatOf(actor, worksheet.id, id);
    if (repeat === null) throw fault;
    return { row: repeat, created: false };
  }
}
