import { Op } from 'sequelize';
import type { Assessment } from '@/hazard/types';
import { clock } from '../clock';
import { Event } from '../models/Event';
import { SignatureRow } from '../models/SignatureRow';
import type { Worksheet } from '../models/Worksheet';
import { WorksheetRevision } from '../models/WorksheetRevision';
import type { AttachmentRow } from '../models/AttachmentRow';
import { notFound } from '../problem';
import { assessAt } from './assessAt';
import { loadPeople } from './readRecord';
import type { People } from './readRecord';
import { placeOf } from './placeOf';
import { attachmentsOf } from './writeDraft';

export interface RevisionParts {
  revision: WorksheetRevision;
  /** As the worksheet stood when this revision was left; the current one as it stands. */
  state: string;
  people: People;
}

/** The state in which each revision ended: what its last event says. */
async function lastStates({ id, revision, state }: Worksheet): Promise<Map<number, string>> {
  const events = await Event.findAll({
    attributes: ['revision', 'payload'],
    where: { subjectId: id, revision: { [Op.not]: null } },
    order: [['seq', 'ASC']],
  });
  const states = new Map<number, string>();
  for (const event of events) {
    const to = event.payload['state'];
    if (event.revision !== null && typeof to === 'string') states.set(event.revision, to);
  }
  return states.set(revision, state);
}

/** Every revision, oldest first. */
export async function listRevisions(worksheet: Worksheet): Promise<RevisionParts[]> {
  const revisions = await WorksheetRevision.findAll({
    where: { worksheetId: worksheet.id },
    order: [['revision', 'ASC']],
  });
  const states = await lastStates(worksheet);
  const people = await loadPeople(revisions.map(({ createdById }) => createdById));
  return revisions.map((revision) => ({
    revision,
    state: states.get(revision.revision) ?? 'draft',
    people,
  }));
}

export interface RevisionDetail extends RevisionParts {
  assessment: Assessment;
  signatures: SignatureRow[];
  attachments: AttachmentRow[];
}

/** One revision with what was signed; 404 for a number that the worksheet does not have. */
export async function readRevision(worksheet: Worksheet, number: number): Promise<RevisionDetail> {
  const where = { worksheetId: worksheet.id, revision: number };
  const revision = await WorksheetRevision.findOne({ where });
  if (revision === null) throw notFound();
  const signatures = await SignatureRow.findAll({
    where,
    order: [
      ['receivedAt', 'ASC'],
      ['signedAt', 'ASC'],
    ],
  });
  const attachments = await attachmentsOf(worksheet.id, number);
  const people = await loadPeople([
    revision.createdById,
    ...signatures.map(({ enteredById }) => enteredById),
  ]);
  const state = (await lastStates(worksheet)).get(number) ?? 'draft';
  const { timeZone } = await placeOf(worksheet);
  const assessment =
    revision.assessment ?? assessAt({ content: revision.content, at: clock.now(), timeZone });
  return { revision, state, people, assessment, signatures, attachments };
}

/** The trail of a worksheet, oldest first. */
export async function listEvents(
  worksheet: Worksheet,
): Promise<{ events: Event[]; people: People }> {
  const events = await Event.findAll({
    where: { subjectId: worksheet.id },
    order: [['seq', 'ASC']],
  });
  return {
    events,
    people: await loadPeople(events.flatMap(({ actorId, enteredById }) => [actorId, enteredById])),
  };
}
