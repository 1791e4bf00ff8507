import type { z } from 'zod';
import type { revisionDetailSchema, revisionSchema, WorksheetEvent } from '@/shared/record';
import type { Event } from '../models/Event';
import type { RevisionDetail, RevisionParts } from '../services/readHistory';
import type { People } from '../services/readRecord';
import { presentAttachment, presentSignature } from './worksheet';

export function presentRevision(parts: RevisionParts): z.infer<typeof revisionSchema> {
  const { revision, state, people } = parts;
  const author = people.get(revision.createdById);
  return {
    revision: revision.revision,
    contentHash: revision.contentHash,
    edition: revision.edition,
    createdAt: revision.createdAt.toISOString(),
    createdBy: {
      id: revision.createdById,
      name: author?.name ?? '',
      role: author?.role ?? 'helper',
    },
    state,
  };
}

export function presentRevisionDetail(parts: RevisionDetail): z.infer<typeof revisionDetailSchema> {
  const { revision, assessment, signatures, attachments, people } = parts;
  return {
    ...presentRevision(parts),
    content: revision.content,
    assessment,
    signatures: signatures.map((row) => presentSignature(row, people)),
    attachments: attachments.map(presentAttachment),
  };
}

export function presentEvent(row: Event, people: People): WorksheetEvent {
  return {
    seq: Number(row.seq),
    type: row.type,
    actorId: row.actorId,
    actorName: row.actorId === null ? null : (people.get(row.actorId)?.name ?? null),
    enteredById: row.enteredById,
    enteredByName: row.enteredById === null ? null : (people.get(row.enteredById)?.name ?? null),
    at: row.at.toISOString(),
    payload: row.payload,
    hash: row.hash,
    previousHash: row.previousHash,
  };
}
