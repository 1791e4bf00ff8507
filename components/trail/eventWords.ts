import type { Messages } from '@/shared/messages';
import type { WorksheetEvent } from '@/shared/record';
import type { MarkState } from '../ui';

type Said = Messages['trail']['event'];

const text = (value: unknown) => (typeof value === 'string' ? value : undefined);

function sentenceOf(event: WorksheetEvent, said: Said, who: string): string {
  const { type, payload } = event;
  if (type === 'created') return text(payload['copiedFrom']) ? said.copied(who) : said.created(who);
  if (type === 'voided' && event.actorId === null) return said.voidedByClock();
  if (type === 'proof-recorded' && payload['proved'] === true) return said.proved(who);
  switch (type) {
    case 'register-applied':
    case 'expired':
      return said[type]();
    case 'prepared':
    case 'acknowledged':
    case 'countersigned':
    case 'signature-refused':
    case 'asked':
    case 'answered':
    case 'returned':
    case 'stopped':
    case 'voided':
    case 'proof-recorded':
    case 'closed':
    case 'photo-added':
    case 'photo-captioned':
    case 'photo-removed':
      return said[type](who);
    default:
      return said.other(who, type);
  }
}

export interface EventWords {
  sentence: string;
  /** Why it was sent back, stopped or withdrawn, in the reader's language where it is a ready reason. */
  reason?: string;
  /** On whose session it was entered, where that is someone else's. */
  enteredBy?: string;
  mark?: MarkState;
}

/** One entry of the trail in words: who did what, and on whose session. */
export function eventWords(event: WorksheetEvent, words: Messages, revision: number): EventWords {
  const { trail, enumerations } = words;
  const who = event.actorId === null ? trail.clock : (event.actorName ?? trail.somebody);
  const sentence =
    event.type === 'revised'
      ? trail.event.revised(who, String(revision))
      : sentenceOf(event, trail.event, who);
  const reason = text(event.payload['reason']);
  const ready: Readonly<Record<string, string>> = enumerations.stopReason;
  const elsewhere = event.enteredById !== null && event.enteredById !== event.actorId;
  return {
    sentence,
    reason: reason === undefined ? undefined : trail.reason(ready[reason] ?? reason),
    enteredBy: elsewhere ? trail.enteredBy(event.enteredByName ?? trail.somebody) : undefined,
    mark: event.type === 'stopped' || event.type === 'expired' ? 'stop' : undefined,
  };
}

/** The revision that each entry belongs to: every `revised` begins the next one. */
export function revisionsOf(events: readonly WorksheetEvent[]): number[] {
  let revision = 1;
  return events.map(({ type }) => {
    if (type === 'revised') revision += 1;
    return revision;
  });
}
