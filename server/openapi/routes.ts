import { z } from 'zod';
import {
  askSchema,
  answerSchema,
  assessSchema,
  attachmentSchema,
  attachmentUpdateSchema,
  closeSchema,
  copySchema,
  createWorksheetSchema,
  deviceInputSchema,
  deviceSchema,
  eventSchema,
  listSchema,
  proofRecordSchema,
  proveSchema,
  questionSchema,
  reasonSchema,
  revisionDetailSchema,
  revisionSchema,
  reviseSchema,
  saveWorksheetSchema,
  signatureSchema,
  signSchema,
  verifySchema,
  worksheetRowSchema,
  worksheetSchema,
} from '@/shared/record';
import {
  rubberGoodsInputSchema,
  rubberGoodsSchema,
  rubberGoodsTestInputSchema,
  rubberGoodsUpdateSchema,
  siteInputSchema,
  siteSchema,
  siteUpdateSchema,
} from '@/shared/register';
import { importAnswerSchema, importSchema } from '@/shared/registerCsv';
import {
  changePasswordSchema,
  changePinSchema,
  createUserSchema,
  inviteAgainSchema,
  ownSessionSchema,
  personSchema,
  requestResetSchema,
  sessionPatchSchema,
  sessionSchema,
  signInSchema,
  updateUserSchema,
  useResetSchema,
} from '@/shared/user';
import { pageSchema } from '../keyset';
import { worksheetFiltersSchema, worksheetListSchema } from '../services/listWorksheets';

export interface ApiRoute {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** In OpenAPI's notation, below `/api`. */
  path: string;
  summary: string;
  /** Whether anybody may ask, without a session. */
  open?: true;
  query?: z.ZodObject;
  body?: z.ZodType;
  /** What it answers with: a schema for JSON, a media type for anything else, nothing for 204. */
  answer?: z.ZodType | string;
  status?: number;
  /** Whether `If-Match` names the version that was read. */
  ifMatch?: true;
  upload?: true;
}

const items = <T extends z.ZodType>(item: T) => z.object({ items: z.array(item) });
const list = listSchema;
/** The verdict with its findings; made by the engine, read by clients as it is. */
const assessment = z.looseObject({ verdict: z.enum(['stop', 'open', 'ready']) });
const health = z.object({ status: z.string(), database: z.string() });
const period = z.object({
  from: z.iso.date().optional(),
  to: z.iso.date().optional(),
  siteId: z.uuid().optional(),
});
const print = z.object({
  revision: z.coerce.number().int().optional(),
  language: z.enum(['en', 'es']).optional(),
});

const session: ApiRoute[] = [
  {
    method: 'post',
    path: '/session',
    summary: 'Sign in',
    open: true,
    body: signInSchema,
    answer: sessionSchema,
    status: 201,
  },
  { method: 'get', path: '/session', summary: 'The signed-in person', answer: sessionSchema },
  {
    method: 'patch',
    path: '/session',
    summary: 'Language, units and theme',
    body: sessionPatchSchema,
    answer: sessionSchema,
  },
  { method: 'delete', path: '/session', summary: 'Sign out' },
  {
    method: 'post',
    path: '/session/password',
    summary: 'Change the password',
    body: changePasswordSchema,
    answer: sessionSchema,
  },
  {
    method: 'post',
    path: '/session/pin',
    summary: 'Change the signing PIN',
    body: changePinSchema,
    answer: sessionSchema,
  },
  { method: 'get', path: '/sessions', summary: 'Own sessions', answer: list(ownSessionSchema) },
  { method: 'delete', path: '/sessions', summary: 'End all other sessions' },
  { method: 'delete', path: '/sessions/{sessionId}', summary: 'End one session' },
  {
    method: 'post',
    path: '/password-resets',
    summary: 'Ask for a link to choose a password',
    open: true,
    body: requestResetSchema,
    answer: z.object({}),
    status: 202,
  },
  {
    method: 'post',
    path: '/password-resets/{token}',
    summary: 'Choose a password, and with an invitation a PIN',
    open: true,
    body: useResetSchema,
  },
  { method: 'get', path: '/devices', summary: 'Own devices', answer: list(deviceSchema) },
  {
    method: 'post',
    path: '/devices',
    summary: 'Add a device that signs without signal',
    body: deviceInputSchema,
    answer: deviceSchema,
    status: 201,
  },
  { method: 'delete', path: '/devices/{deviceId}', summary: 'Take a device off' },
];

/** List, one, create and change, as every part of the register has them. */
function registerRoutes(
  path: string,
  what: string,
  schemas: { record: z.ZodType; input: z.ZodType; update: z.ZodType },
): ApiRoute[] {
  const { record, input, update } = schemas;
  return [
    {
      method: 'get',
      path,
      summary: `List ${what}`,
      query: pageSchema,
      answer: list(record),
    },
    {
      method: 'post',
      path,
      summary: `Add to ${what}`,
      body: input,
      answer: record,
      status: 201,
    },
    { method: 'get', path: `${path}/{id}`, summary: `One of ${what}`, answer: record },
    {
      method: 'patch',
      path: `${path}/{id}`,
      summary: `Change one of ${what}`,
      body: update,
      answer: record,
    },
  ];
}

const W = '/worksheets/{worksheetId}';
const act = (name: string, summary: string, body: z.ZodType, status = 200): ApiRoute => ({
  method: 'post',
  path: `${W}/${name}`,
  summary,
  body,
  answer: worksheetSchema,
  status,
});

const worksheets: ApiRoute[] = [
  {
    method: 'get',
    path: '/worksheets',
    summary: 'Worksheets that the person may see',
    query: worksheetListSchema,
    answer: list(worksheetRowSchema),
  },
  {
    method: 'post',
    path: '/worksheets',
    summary: 'Begin a draft',
    body: createWorksheetSchema,
    answer: worksheetSchema,
    status: 201,
  },
  { method: 'get', path: W, summary: 'One worksheet', answer: worksheetSchema },
  {
    method: 'put',
    path: W,
    summary: 'Save the draft',
    body: saveWorksheetSchema,
    answer: worksheetSchema,
    ifMatch: true,
  },
  {
    method: 'post',
    path: `${W}/signatures`,
    summary: 'Sign',
    body: signSchema,
    answer: signatureSchema,
    status: 201,
  },
  {
    method: 'post',
    path: `${W}/proofs`,
    summary: 'Record the test for absence of voltage',
    body: proveSchema,
    answer: proofRecordSchema,
    status: 201,
  },
  {
    method: 'post',
    path: `${W}/questions`,
    summary: 'Ask',
    body: askSchema,
    answer: questionSchema,
    status: 201,
  },
  {
    method: 'post',
    path: `${W}/questions/{questionId}/answer`,
    summary: 'Answer a question',
    body: answerSchema,
    answer: questionSchema,
    status: 201,
  },
  act('return', 'Send back with a reason', reasonSchema),
  act('stop', 'Stop the work', reasonSchema),
  act('void', 'Withdraw', reasonSchema),
  act('revise', 'Begin the next revision', reviseSchema),
  act('close', 'Close out', closeSchema),
  act('copy', 'Copy into a new draft', copySchema, 201),
  {
    method: 'get',
    path: `${W}/revisions`,
    summary: 'Its revisions',
    answer: items(revisionSchema),
  },
  {
    method: 'get',
    path: `${W}/revisions/{revision}`,
    summary: 'One revision',
    answer: revisionDetailSchema,
  },
  { method: 'get', path: `${W}/events`, summary: 'Its audit trail', answer: items(eventSchema) },
  {
    method: 'get',
    path: `${W}/pdf`,
    summary: 'The printed record',
    query: print,
    answer: 'application/pdf',
  },
  {
    method: 'post',
    path: `${W}/attachments`,
    summary: 'Add a photo',
    upload: true,
    answer: attachmentSchema,
    status: 201,
  },
  {
    method: 'get',
    path: '/attachments/{attachmentId}',
    summary: 'A photo',
    answer: 'image/jpeg',
  },
  {
    method: 'get',
    path: '/attachments/{attachmentId}/thumbnail',
    summary: 'A photo, small',
    answer: 'image/jpeg',
  },
  {
    method: 'patch',
    path: '/attachments/{attachmentId}',
    summary: 'Change the caption of a photo that nobody has signed',
    body: attachmentUpdateSchema,
    answer: attachmentSchema,
  },
  { method: 'delete', path: '/attachments/{attachmentId}', summary: 'Take a photo off a draft' },
  {
    method: 'get',
    path: '/worksheets/export.csv',
    summary: 'The list as CSV',
    query: worksheetFiltersSchema,
    answer: 'text/csv',
  },
  {
    method: 'get',
    path: '/worksheets/export.zip',
    summary: 'The printed records of the list',
    query: worksheetFiltersSchema,
    answer: 'application/zip',
  },
];

const registerActs: ApiRoute[] = [
  {
    method: 'post',
    path: '/users/{id}/invitation',
    summary: 'Mail the invitation again to somebody who has not chosen a password',
    body: inviteAgainSchema,
    answer: personSchema,
  },
  {
    method: 'post',
    path: '/rubber-goods/{id}/tests',
    summary: 'Record one more test; one that failed retires the item',
    body: rubberGoodsTestInputSchema,
    answer: rubberGoodsSchema,
    status: 201,
  },
];

const others: ApiRoute[] = [
  {
    method: 'post',
    path: '/assessments',
    summary: 'Assess without storing',
    body: assessSchema,
    answer: assessment,
  },
  {
    method: 'get',
    path: '/insights',
    summary: 'Counts over a period',
    query: period,
    answer: z.looseObject({}),
  },
  {
    method: 'get',
    path: '/verify/{number}/{hash}',
    summary: 'Whether a paper is the record',
    open: true,
    answer: verifySchema,
  },
  { method: 'get', path: '/health', summary: 'State of the service', open: true, answer: health },
  {
    method: 'get',
    path: '/openapi.json',
    summary: 'This document',
    open: true,
    answer: z.looseObject({}),
  },
];

/** People and rubber goods as a spreadsheet, in and out. */
const csvRoutes = (path: string, subject: string): ApiRoute[] => [
  {
    method: 'post',
    path: `${path}/import`,
    summary: `Check the lines of a CSV of ${subject}; with confirm, add all of them or none`,
    body: importSchema,
    answer: importAnswerSchema,
  },
  {
    method: 'get',
    path: `${path}/export.csv`,
    summary: `All ${subject} as CSV`,
    answer: 'text/csv',
  },
];

/** Every route, for the OpenAPI document and for the test that compares it with what answers. */
export const API_ROUTES: readonly ApiRoute[] = [
  ...session,
  ...worksheets,
  ...registerRoutes('/users', 'people', {
    record: personSchema,
    input: createUserSchema,
    update: updateUserSchema,
  }),
  ...registerRoutes('/sites', 'sites', {
    record: siteSchema,
    input: siteInputSchema,
    update: siteUpdateSchema,
  }),
  ...registerRoutes('/rubber-goods', 'rubber goods', {
    record: rubberGoodsSchema,
    input: rubberGoodsInputSchema,
    update: rubberGoodsUpdateSchema,
  }),
  ...registerActs,
  ...csvRoutes('/users', 'people'),
  ...csvRoutes('/rubber-goods', 'rubber goods'),
  ...others,
];
