import { v7 } from 'uuid';
import type { Role } from '@/shared/user';
import type { Asker, Relation } from './authorizationPeople';
import { RELATIONS } from './authorizationPeople';
import { STROKES } from './record';
import { PIN } from './server';

/**
 * Who gets what from each route, typed from the interface's contract: its table
 * of routes, "A request is judged in this order", "Life of a worksheet" and
 * "Trust". Never worked out from the policies, which are what is tested.
 *
 * `allowed` means that neither session, nor sight, nor role refuses: the answer
 * is 2xx, or names something else that is wrong with the request.
 */
export type Outcome = 'allowed' | 401 | 403 | 404;

/** One outcome whatever the relation, or one each in the order of `RELATIONS`. */
type Cells = Outcome | readonly [Outcome, Outcome, Outcome, Outcome, Outcome, Outcome, Outcome];
type Outcomes = Record<Role | 'nobody', Cells>;

interface Sent {
  query?: object;
  body?: object;
  headers?: Record<string, string>;
}
interface Row {
  outcomes: Outcomes;
  /** A request that is right but for who sends it, or that fails only after that was judged. */
  send: (asker: Asker) => Sent;
}

const A = 'allowed';
const row = (outcomes: Outcomes, send: Row['send'] = () => ({})): Row => ({ outcomes, send });
const body = (content: object) => () => ({ body: content });

const anyone: Outcomes = { lead: A, helper: A, supervisor: A, safety: A, nobody: A };
const signedIn: Outcomes = { ...anyone, nobody: 401 };
const only = (...roles: Role[]): Outcomes => ({
  ...{ lead: 403, helper: 403, supervisor: 403, safety: 403, nobody: 401 },
  ...Object.fromEntries(roles.map((role) => [role, A])),
});

/*                       own  creator named wasNamed sameSite otherSite noSite */
// "A lead or helper sees their own, a supervisor their sites', safety all."
const reads: Outcomes = {
  lead: /*          */ [A, A, A, A, 404, 404, 404],
  helper: /*        */ [A, A, A, A, 404, 404, 404],
  supervisor: /*    */ [A, A, A, A, A, 404, 404],
  safety: A,
  nobody: 401,
};
// "Its lead": by `leadId`, which never changes, whatever that person's role is now.
const itsLead: Outcomes = {
  lead: /*          */ [A, 403, 403, 403, 404, 404, 404],
  helper: /*        */ [A, 403, 403, 403, 404, 404, 404],
  supervisor: /*    */ [A, 403, 403, 403, 403, 404, 404],
  safety: /*        */ [A, 403, 403, 403, 403, 403, 403],
  nobody: 401,
};
// A copy begins a worksheet: its lead, who must be one that may begin any.
const copies: Outcomes = {
  ...itsLead,
  helper: /*        */ [403, 403, 403, 403, 404, 404, 404],
  safety: 403,
};
// "The signer": crew of the current revision, and a supervisor of the site, who may countersign.
const signs: Outcomes = {
  lead: /*          */ [A, 403, A, 403, 404, 404, 404],
  helper: /*        */ [A, 403, A, 403, 404, 404, 404],
  supervisor: /*    */ [A, 403, A, A, A, 404, 404],
  safety: /*        */ [A, 403, A, 403, 403, 403, 403],
  nobody: 401,
};
// "Anyone named on it, supervisor of the site."
const stops = signs;
const asks: Outcomes = {
  ...signs,
  supervisor: /*    */ [A, 403, A, 403, 403, 404, 404],
};
const returns: Outcomes = {
  lead: /*          */ [403, 403, 403, 403, 404, 404, 404],
  helper: /*        */ [403, 403, 403, 403, 404, 404, 404],
  supervisor: /*    */ [A, 403, A, A, A, 404, 404],
  safety: 403,
  nobody: 401,
};
const voids: Outcomes = {
  ...itsLead,
  supervisor: /*    */ [A, 403, A, A, A, 404, 404],
};
// "Everyone else reads active people of their own sites, their own sites, the rubber goods of their sites."
const registerReads: Outcomes = {
  lead: /*          */ [A, 404, A, A, A, 404, 404],
  helper: /*        */ [A, 404, A, A, A, 404, 404],
  supervisor: /*    */ [A, 404, A, A, A, 404, 404],
  safety: A,
  nobody: 401,
};
const registerWrites: Outcomes = {
  lead: /*          */ [403, 404, 403, 403, 403, 404, 404],
  helper: /*        */ [403, 404, 403, 403, 403, 404, 404],
  supervisor: /*    */ [403, 404, 403, 403, 403, 404, 404],
  safety: A,
  nobody: 401,
};
// "Own sessions", "own devices": another's is not found, by safety neither.
const theirs: Cells = [A, 404, 404, 404, 404, 404, 404];
const owner: Outcomes = {
  ...{ lead: theirs, helper: theirs, supervisor: theirs, safety: theirs },
  nobody: 401,
};

/** What this person would sign, if anything: nothing is awaited on a draft that is not ready. */
function signature({ user, role, relation, target }: Asker): Sent {
  const isCrew = relation === 'own' || relation === 'named';
  const other = role === 'supervisor' && !isCrew ? 'countersigned' : 'acknowledged';
  return {
    body: {
      id: v7(),
      meaning: relation === 'own' ? 'prepared' : other,
      signerId: user.id,
      pin: PIN,
      strokes: STROKES,
      contentHash: target.contentHash,
    },
  };
}

const W = '/worksheets/{worksheetId}';
const NOTHING = { query: { q: 'nothingliesunderthisword' } };

const register = (path: string): Record<string, Row> => ({
  [`get ${path}`]: row(signedIn),
  [`post ${path}`]: row(only('safety')),
  [`get ${path}/{id}`]: row(registerReads),
  [`patch ${path}/{id}`]: row(registerWrites),
});
const spreadsheet = (path: string): Record<string, Row> => ({
  [`post ${path}/import`]: row(only('safety'), body({ csv: '' })),
  [`get ${path}/export.csv`]: row(only('safety')),
});

/** One row a route, by method and path. */
export const AUTHORIZATION: Record<string, Row> = {
  'post /session': row(anyone),
  'get /session': row(signedIn),
  'patch /session': row(signedIn, body({ theme: 'dark' })),
  'delete /session': row(signedIn),
  'post /session/password': row(signedIn),
  'post /session/pin': row(signedIn),
  'get /sessions': row(signedIn),
  'delete /sessions': row(signedIn),
  'delete /sessions/{sessionId}': row(owner),
  'post /password-resets': row(anyone),
  'post /password-resets/{token}': row(anyone),
  'get /devices': row(signedIn),
  'post /devices': row(signedIn),
  'delete /devices/{deviceId}': row(owner),

  'get /worksheets': row(signedIn),
  'post /worksheets': row(only('lead', 'supervisor')),
  [`get ${W}`]: row(reads),
  [`put ${W}`]: row(itsLead, () => ({
    headers: { 'If-Match': '"999"' },
    body: { content: { notes: 'Typed over another version.' } },
  })),
  [`post ${W}/signatures`]: row(signs, signature),
  [`post ${W}/proofs`]: row(itsLead, body({ proof: {}, pin: PIN })),
  [`post ${W}/questions`]: row(asks, body({ text: 'Who opens it?' })),
  [`post ${W}/questions/{questionId}/answer`]: row(itsLead, body({ text: 'I do.' })),
  [`post ${W}/return`]: row(returns, body({ reason: 'Not so.' })),
  [`post ${W}/stop`]: row(stops, body({ reason: 'still live' })),
  // A draft can be withdrawn, and the rows that follow need it.
  [`post ${W}/void`]: row(voids, body({ reason: '' })),
  [`post ${W}/revise`]: row(itsLead),
  [`post ${W}/close`]: row(itsLead, body({ closeOut: {}, pin: PIN })),
  [`post ${W}/copy`]: row(copies),
  [`get ${W}/revisions`]: row(reads),
  [`get ${W}/revisions/{revision}`]: row(reads),
  [`get ${W}/events`]: row(reads),
  // A language that is not there is named after who asks was judged, and costs no rendering.
  [`get ${W}/pdf`]: row(reads, () => ({ query: { language: 'fr' } })),
  [`post ${W}/attachments`]: row(itsLead),
  'get /attachments/{attachmentId}': row(reads),
  'get /attachments/{attachmentId}/thumbnail': row(reads),
  'patch /attachments/{attachmentId}': row(itsLead, body({ caption: 'The door.' })),
  'delete /attachments/{attachmentId}': row(itsLead),
  'get /worksheets/export.csv': row(only('safety'), () => NOTHING),
  'get /worksheets/export.zip': row(only('safety'), () => NOTHING),

  ...register('/users'),
  ...register('/sites'),
  ...register('/rubber-goods'),
  'post /users/{id}/invitation': row(registerWrites),
  'post /rubber-goods/{id}/tests': row(registerWrites),
  ...spreadsheet('/users'),
  ...spreadsheet('/rubber-goods'),

  'post /assessments': row(signedIn, body({ content: {} })),
  'get /insights': row(only('supervisor', 'safety')),
  'get /verify/{number}/{hash}': row(anyone),
  'get /health': row(anyone),
  'get /openapi.json': row(anyone),
};

/** What the contract says that this person gets from this route. */
export function expectedOutcome(
  route: string,
  { role, relation }: { role: Role | 'nobody'; relation: Relation },
): Outcome {
  const cells = AUTHORIZATION[route]?.outcomes[role];
  if (cells === undefined) throw new Error(`No row for ${route}`);
  return typeof cells === 'object' ? (cells[RELATIONS.indexOf(relation)] ?? 404) : cells;
}
