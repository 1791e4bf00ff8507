import { mkdirSync } from 'node:fs';
import { writeFile } from 'node:fs/promises';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import { SMTPServer } from 'smtp-server';
import { clock } from '../clock';

export interface ReceivedMail {
  from: string;
  to: string[];
  subject: string;
  messageId: string;
  text: string;
  raw: string;
}

export interface SmtpFake {
  url: string;
  mails: ReceivedMail[];
  stop(): Promise<void>;
}

/** A mail server that keeps what it gets instead of sending it: in a list and, with a folder, as files. */
export async function startSmtpFake(folder?: string): Promise<SmtpFake> {
  if (folder !== undefined) mkdirSync(folder, { recursive: true, mode: 0o700 });
  const mails: ReceivedMail[] = [];
  const server = new SMTPServer({
    disabledCommands: ['STARTTLS'],
    authOptional: true,
    logger: false,
    onData(stream, session, callback) {
      const chunks: Buffer[] = [];
      stream.on('data', (chunk: Buffer) => chunks.push(chunk));
      stream.once('end', () => {
        const { mailFrom, rcptTo } = session.envelope;
        const mail = readMail(Buffer.concat(chunks).toString('utf8'), {
          from: mailFrom === false ? '' : mailFrom.address,
          to: rcptTo.map(({ address }) => address),
        });
        mails.push(mail);
        keep(mail, folder, mails.length).then(
          () => callback(),
          (error: unknown) => callback(error instanceof Error ? error : new Error(String(error))),
        );
      });
    },
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', () => resolve()));
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    mails,
    stop: () => new Promise((resolve) => server.close(() => resolve())),
  };
}

async function keep(mail: ReceivedMail, folder: string | undefined, count: number): Promise<void> {
  if (folder === undefined) return;
  const stamp = clock.now().toISOString().replaceAll(':', '-');
  await writeFile(path.join(folder, `${stamp}-${count}.eml`), mail.raw, { mode: 0o600 });
}

/** Enough of RFC 5322 for mails that this server writes itself: one plain text part. */
function readMail(raw: string, envelope: Pick<ReceivedMail, 'from' | 'to'>): ReceivedMail {
  const split = raw.indexOf('\r\n\r\n');
  const head = raw.slice(0, split).replaceAll(/\r\n[ \t]+/g, ' ');
  const header = (name: string) => new RegExp(`^${name}: (.*)$`, 'im').exec(head)?.[1] ?? '';
  const body = raw.slice(split + 4);
  const encoding = header('Content-Transfer-Encoding').toLowerCase();
  return {
    ...envelope,
    raw,
    subject: decodeWords(header('Subject')),
    messageId: header('Message-ID'),
    text: encoding === 'base64' ? Buffer.from(body, 'base64').toString('utf8') : unquote(body),
  };
}

function unquote(text: string): string {
  const bytes = text
    .replaceAll(/=\r?\n/g, '')
    .replaceAll(/=([0-9A-F]{2})/g, (_match, hex: string) => String.fromCharCode(parseInt(hex, 16)));
  return Buffer.from(bytes, 'latin1').toString('utf8');
}

/** RFC 2047 words of a subject. */
function decodeWords(text: string): string {
  return text
    .replaceAll(/\?=\s+=\?/g, '?==?')
    .replaceAll(/=\?utf-8\?([QB])\?(.*?)\?=/gi, (_match, kind: string, value: string) =>
      kind.toUpperCase() === 'B'
        ? Buffer.from(value, 'base64').toString('utf8')
        : unquote(value.replaceAll('_', ' ')),
    );
}
