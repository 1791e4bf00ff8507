import { v7 } from 'uuid';
import { clock } from '../clock';
import type { CurrentUser } from '../currentUser';
import { QuestionRow } from '../models/QuestionRow';
import type { Worksheet } from '../models/Worksheet';
import { conflict, idTaken, notFound } from '../problem';
import { actOn } from './changeState';
import { sha256 } from './contentHash';
import { notify } from './notify';
import { recordEvent } from './recordEvent';

interface NewAnswer {
  questionId: string;
  id?: string | undefined;
  text: string;
}

/** The question of this worksheet, or 404. */
export async function findQuestion(worksheetId: string, questionId: string): Promise<QuestionRow> {
  const question = await QuestionRow.findOne({ where: { id: questionId, worksheetId } });
  if (question === null) throw notFound();
  return question;
}

function isRepeat(question: QuestionRow, actor: CurrentUser, { id, text }: NewAnswer): boolean {
  return (
    question.answeredById === actor.id &&
    question.answer === text &&
    (id === undefined || question.answerId === id)
  );
}

/** The lead answers a question, once. The same answer again is the same answer. */
export async function answerQuestion(
  actor: CurrentUser,
  worksheet: Worksheet,
  answer: NewAnswer,
): Promise<{ row: QuestionRow; created: boolean }> {
  const { questionId, id = v7(), text } = answer;
  const before = await findQuestion(worksheet.id, questionId);
  if (isRepeat(before, actor, answer)) return { row: before, created: false };
  const taken = await QuestionRow.findOne({ where: { answerId: id } });
  if (taken !== null && taken.id !== questionId) throw idTaken();
  return actOn(worksheet.id, 'answer', async (held, transaction) => {
    const row = await QuestionRow.findByPk(questionId, { transaction, rejectOnEmpty: true });
    if (isRepeat(row, actor, answer)) return { row, created: false };
    if (row.answer !== null) throw conflict('This question has been answered.');
    const answeredAt = clock.now();
    await row.update(
      { answerId: id, answer: text, answeredById: actor.id, answeredAt },
      { transaction },
    );
    const event = await recordEvent(transaction, {
      subjectType: 'worksheet',
      subjectId: held.id,
      revision: held.revision,
      type: 'answered',
      actorId: actor.id,
      payload: { questionId, answerId: id, textHash: sha256(text), state: held.state },
    });
    const recipientIds = [row.askedById].filter((person) => person !== actor.id);
    await notify(transaction, { event, news: 'answered', worksheet: held, recipientIds });
    return { row, created: true };
  });
}
