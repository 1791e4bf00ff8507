import { createHash } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { messages } from '@/shared/messages';
import type { Messages } from '@/shared/messages';
import type { Locale } from '@/shared/user';
import { publicUrl } from '../env';
import { queueJob } from '../jobs';

/** Whoever gets a mail. */
export interface Recipient {
  id: string;
  name: string;
  email: string;
  locale: Locale;
}

/** What lies in the queue. A link with a token is made when it is sent: a token is never stored. */
export type MailJob =
  | { kind: 'text'; messageId: string; to: string; subject: string; text: string }
  | { kind: 'link'; link: 'reset' | 'invitation'; userId: string };

/** A minute apart for longer than a week: a mail server that is away loses nothing. */
const PATIENT = { retryLimit: 20_000, retryDelay: 60, retentionDays: 30, expireInSeconds: 120 };

interface Mail {
  recipient: Recipient;
  /** What the mail is about, such as an event's id. With the recipient it makes the Message-ID, so that a repeated delivery can be told. */
  about: string;
  words: (messages: Messages['mail']) => { subject: string; body: string };
  /** A path of the app, such as `/worksheets/…`. */
  path?: string;
}

/** Queues a mail as part of a transaction: sent when it commits, never when it is rolled back. */
export async function queueMail(
  transaction: Transaction,
  { recipient, about, words, path }: Mail,
): Promise<void> {
  const { mail } = messages(recipient.locale);
  const { subject, body } = words(mail);
  const link = path === undefined ? [] : [`${publicUrl()}${path}`];
  const text = [mail.greeting(recipient.name), body, ...link, mail.foot].join('\n\n');
  const messageId = messageIdOf(about, recipient.id);
  const job: MailJob = { kind: 'text', messageId, to: recipient.email, subject, text };
  await queueJob(transaction, 'mail', job, PATIENT);
}

/** Queues the mail with a link to choose a password. */
export async function queueLinkMail(
  transaction: Transaction,
  link: 'reset' | 'invitation',
  userId: string,
): Promise<void> {
  const job: MailJob = { kind: 'link', link, userId };
  await queueJob(transaction, 'mail', job, PATIENT);
}

/** The same event and recipient always give the same id. */
export function messageIdOf(about: string, recipientId: string): string {
  const hash = createHash('sha256').update(`${about} ${recipientId}`).digest('hex').slice(0, 40);
  return `<${hash}@${new URL(publicUrl()).hostname}>`;
}
