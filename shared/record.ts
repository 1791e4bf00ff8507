import { z } from 'zod';
import type { Assessment } from '@/hazard/types';
import { dateTime, id, requiredText, text } from './text';
import { closeOutSchema, proofSchema, worksheetContentSchema } from './worksheet';
import { pin, ROLES } from './user';

export const STATES = [
  'draft',
  'briefing',
  'countersign',
  'in-force',
  'returned',
  'stopped',
  'expired',
  'void',
  'closed',
] as const;
export type WorksheetState = (typeof STATES)[number];

export const MEANINGS = ['prepared', 'acknowledged', 'countersigned'] as const;
export type Meaning = (typeof MEANINGS)[number];

/** Eight ready reasons to stop or refuse; own words are admitted as well. */
export const STOP_REASONS = [
  'still live',
  'not as described',
  'a way it can be live is missing',
  'a lock was moved',
  'someone came too close',
  'equipment damaged or wet',
  'not trained for this',
  'I will not do this',
] as const;

/** The sections that a photo may belong to: a top-level key of the content, or the close-out. */
export const ATTACHMENT_SECTIONS = [
  'job',
  'supply',
  'egress',
  'egressSupply',
  'egressReaches',
  'sources',
  'decision',
  'absenceTest',
  'arcFlash',
  'protectiveEquipment',
  'surroundings',
  'crew',
  'briefing',
  'notes',
  'closeOut',
] as const;

const point = z.tuple([z.number().min(0).max(4096), z.number().min(0).max(4096)]);
/** One list of points a stroke, in CSS pixels from the pad's top left. */
export const strokesSchema = z
  .array(z.array(point))
  .min(1)
  .max(100)
  .refine(
    (strokes) => {
      const points = strokes.reduce((sum, stroke) => sum + stroke.length, 0);
      return points >= 2 && points <= 5000;
    },
    { error: '2 to 5000 points', params: { code: 'points' } },
  );
export type Strokes = z.infer<typeof strokesSchema>;

export const hashSchema = z.string().regex(/^[0-9a-f]{64}$/, { error: 'a SHA-256 in lower case' });

export const createWorksheetSchema = z.strictObject({
  id: id.optional(),
  content: worksheetContentSchema,
  leadId: id.optional(),
});
export const saveWorksheetSchema = z.strictObject({ content: worksheetContentSchema });

const signatureCommon = {
  id: id.optional(),
  meaning: z.enum(MEANINGS),
  signerId: id,
  strokes: strokesSchema,
  contentHash: hashSchema,
};
export const signSchema = z.union([
  z.strictObject({ ...signatureCommon, pin }),
  z.strictObject({
    ...signatureCommon,
    deviceId: id,
    signedAt: dateTime,
    signature: z.string().regex(/^[A-Za-z0-9_-]{86}$/, { error: 'base64url, 64 bytes' }),
  }),
]);
export const proveSchema = z.strictObject({ id: id.optional(), proof: proofSchema, pin });
export const askSchema = z.strictObject({ id: id.optional(), text: requiredText(2000) });
export const answerSchema = z.strictObject({ id: id.optional(), text: requiredText(2000) });
/* The id of an act makes its repeat after a lost answer the same act. */
export const reasonSchema = z.strictObject({ id: id.optional(), reason: requiredText(2000) });
export const reviseSchema = z.strictObject({ id: id.optional() });
export const closeSchema = z.strictObject({ id: id.optional(), closeOut: closeOutSchema, pin });
export const copySchema = z.strictObject({ id: id.optional() });
/** The fields beside the file of an upload. */
export const attachmentInputSchema = z.strictObject({
  id: id.optional(),
  section: z.enum(ATTACHMENT_SECTIONS),
  caption: text().default(''),
});
/** What of a photo may change until somebody signs. */
export const attachmentUpdateSchema = z.strictObject({ caption: text() });
export const assessSchema = z.strictObject({
  content: worksheetContentSchema,
  stage: z.enum(['plan', 'work', 'close-out']).optional(),
  proof: proofSchema.optional(),
  closeOut: closeOutSchema.optional(),
});
export const deviceInputSchema = z.strictObject({
  id,
  publicKey: z.looseObject({
    kty: z.literal('EC'),
    crv: z.literal('P-256'),
    x: z.string().max(64),
    y: z.string().max(64),
  }),
  label: text(),
  pin,
});

/* Answers are lenient, so that an old client survives a new field. */

/** Made by our own `assess` on the server; its shape is the type, not parsed again. */
const assessmentSchema = z.custom<Assessment>(
  (value) => typeof value === 'object' && value !== null,
);

const actor = z.object({ id: z.string(), name: z.string(), role: z.enum(ROLES) });

export const signatureSchema = z.object({
  id: z.string(),
  meaning: z.enum(MEANINGS),
  signer: actor,
  enteredById: z.string(),
  enteredByName: z.string().optional(),
  revision: z.number(),
  contentHash: z.string().optional(),
  signedAt: z.string(),
  receivedAt: z.string(),
  /** `pin` or `device`. */
  method: z.string(),
  strokes: strokesSchema.optional(),
});
export type Signature = z.infer<typeof signatureSchema>;

export const proofRecordSchema = z.object({
  id: z.string(),
  at: z.string(),
  proof: proofSchema,
  assessment: assessmentSchema,
  byId: z.string(),
  byName: z.string(),
  revision: z.number(),
});
export type ProofRecord = z.infer<typeof proofRecordSchema>;

export const questionSchema = z.object({
  id: z.string(),
  text: z.string(),
  askedBy: actor,
  askedAt: z.string(),
  revision: z.number(),
  answer: z.string().nullable(),
  answeredBy: actor.nullable(),
  answeredAt: z.string().nullable(),
});
export type Question = z.infer<typeof questionSchema>;

export const attachmentSchema = z.object({
  id: z.string(),
  section: z.enum(ATTACHMENT_SECTIONS),
  caption: z.string(),
  sha256: z.string(),
});
export type Attachment = z.infer<typeof attachmentSchema>;

/** The whole record of one worksheet, as `GET /api/worksheets/:id` answers it. */
export const worksheetSchema = z.object({
  id: z.string(),
  number: z.string(),
  state: z.enum(STATES),
  proved: z.boolean(),
  revision: z.number(),
  version: z.number(),
  content: worksheetContentSchema,
  contentHash: z.string(),
  assessment: assessmentSchema,
  workAssessment: assessmentSchema.nullable(),
  signatures: z.array(signatureSchema),
  proofs: z.array(proofRecordSchema),
  closeOut: z.object({ closeOut: closeOutSchema, at: z.string(), byName: z.string() }).nullable(),
  questions: z.array(questionSchema),
  attachments: z.array(attachmentSchema),
  leadId: z.string(),
  leadName: z.string(),
  siteName: z.string().nullable(),
  timeZone: z.string(),
  /** Why it was returned, stopped or voided, by whom; null in every other state. */
  reason: z.object({ text: z.string(), byName: z.string(), at: z.string() }).nullable(),
  /** Stops that the lead cleared before signing: shown to the supervisor and in the archive. */
  clearedStops: z.array(z.object({ code: z.string(), path: z.string() })),
  /** What the asking person may do now: the client offers nothing else. */
  actions: z.array(z.string()),
  createdAt: z.string(),
  updatedAt: z.string(),
});
export type WorksheetRecord = z.infer<typeof worksheetSchema>;

/** One row of a list, a queue or the board. */
export const worksheetRowSchema = z.object({
  id: z.string(),
  number: z.string(),
  state: z.enum(STATES),
  proved: z.boolean(),
  mode: z.enum(['off', 'energized']).nullable(),
  verdict: z.enum(['stop', 'open', 'ready']),
  counts: z.object({ stop: z.number(), open: z.number(), caution: z.number() }),
  /** Codes of what was met on the way, stops that were cleared since included. */
  metCodes: z.array(z.string()).optional(),
  revision: z.number(),
  siteId: z.string().nullable(),
  siteName: z.string().nullable(),
  timeZone: z.string(),
  area: z.string(),
  equipment: z.string(),
  task: z.string().nullable(),
  system: z.string().nullable(),
  circuitVolts: z.number().nullable(),
  leadId: z.string(),
  leadName: z.string(),
  crew: z.array(z.object({ userId: z.string().nullable(), name: z.string() })),
  /** Crew members (user ids) who have not yet acknowledged, while in briefing. */
  awaiting: z.array(z.string()),
  openQuestions: z.array(z.object({ text: z.string(), byName: z.string() })),
  reason: z.string().nullable(),
  reasonBy: z.string().nullable(),
  startsAt: z.string().nullable(),
  endsAt: z.string().nullable(),
  createdAt: z.string(),
  updatedAt: z.string(),
});
export type WorksheetRow = z.infer<typeof worksheetRowSchema>;

export function listSchema<T extends z.ZodType>(item: T) {
  return z.object({ items: z.array(item), nextCursor: z.string().nullable() });
}

export const revisionSchema = z.object({
  revision: z.number(),
  contentHash: z.string(),
  edition: z.string(),
  createdAt: z.string(),
  createdBy: actor,
  state: z.string(),
});
export const revisionDetailSchema = revisionSchema.extend({
  content: worksheetContentSchema,
  assessment: assessmentSchema,
  signatures: z.array(signatureSchema),
  attachments: z.array(attachmentSchema),
});

export const eventSchema = z.object({
  seq: z.number(),
  type: z.string(),
  actorId: z.string().nullable(),
  actorName: z.string().nullable().optional(),
  enteredById: z.string().nullable(),
  enteredByName: z.string().nullable().optional(),
  at: z.string(),
  payload: z.record(z.string(), z.unknown()),
  hash: z.string(),
  previousHash: z.string().nullable(),
});
export type WorksheetEvent = z.infer<typeof eventSchema>;

export const verifySchema = z.object({
  matches: z.boolean(),
  state: z.enum(STATES).optional(),
  revision: z.number().optional(),
  superseded: z.boolean().optional(),
  signedAt: z.string().optional(),
});

export const deviceSchema = z.object({
  id: z.string(),
  label: z.string(),
  createdAt: z.string(),
  lastUsedAt: z.string().nullable(),
  revoked: z.boolean(),
});
