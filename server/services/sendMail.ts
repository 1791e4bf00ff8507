import { createHash, randomBytes } from 'node:crypto';
import { createTransport } from 'nodemailer';
import type { Transporter } from 'nodemailer';
import { Op } from 'sequelize';
import { messages } from '@/shared/messages';
import { clock } from '../clock';
import { env, publicUrl } from '../env';
import { User } from '../models/User';
import { PasswordReset } from '../models/PasswordReset';
import { messageIdOf } from './queueMail';
import type { MailJob } from './queueMail';

export const LINK_MILLISECONDS = 3_600_000;

/** A mail server that does not speak: the job ends before the queue takes it for lost, and is tried again. */
const PATIENCE = { connectionTimeout: 15_000, greetingTimeout: 15_000, socketTimeout: 30_000 };

let transport: Transporter | undefined;

/** Sends one mail of the queue. It throws where the mail server does not take it, and the queue tries again. */
export async function sendMail(job: MailJob): Promise<void> {
  const mail = job.kind === 'text' ? job : await linkMail(job);
  if (mail === null) return;
  transport ??= createTransport({ url: env.SMTP_URL, ...PATIENCE }, { from: env.MAIL_FROM });
  await transport.sendMail({
    messageId: mail.messageId,
    to: mail.to,
    subject: mail.subject,
    text: mail.text,
    textEncoding: 'quoted-printable',
  });
}

/** A fresh token at each delivery; only its hash is kept. */
async function linkMail({ link, userId }: Extract<MailJob, { kind: 'link' }>) {
  const user = await User.findByPk(userId);
  if (user === null || user.retiredAt !== null) return null;
  const token = randomBytes(32).toString('base64url');
  const now = clock.now();
  const tokenHash = hashToken(token);
  // Of several invitations only the one that was mailed last may be used.
  if (link === 'invitation') {
    await PasswordReset.update(
      { usedAt: now },
      { where: { userId, kind: link, usedAt: { [Op.is]: null } } },
    );
  }
  await PasswordReset.create({
    tokenHash,
    userId,
    kind: link,
    expiresAt: new Date(now.getTime() + LINK_MILLISECONDS),
    createdAt: now,
  });
  const { mail } = messages(user.locale);
  const words = mail[link];
  return {
    messageId: messageIdOf(tokenHash, userId),
    to: user.email,
    subject: words.subject,
    text: [mail.greeting(user.name), words.body(`${publicUrl()}/${link}/${token}`), mail.foot].join(
      '\n\n',
    ),
  };
}

/** What is kept of a token. */
export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
