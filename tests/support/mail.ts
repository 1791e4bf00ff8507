import { boss, startBoss } from '@/server/jobs';
import { handlers } from '@/server/worker';
import { receivedMails } from './server';

/** Does what the worker would do with the mails that are queued now; answers what the mail server got so far. */
export async function deliverMails() {
  await startBoss();
  for (;;) {
    const jobs = await boss.fetch<object>('mail', { batchSize: 50 });
    if (jobs.length === 0) return receivedMails();
    for (const { id, data } of jobs) {
      await handlers.mail(data);
      await boss.complete('mail', id);
    }
  }
}

/** The link to choose a password in the latest mail to that address. */
export async function linkMailedTo(email: string): Promise<{ kind: string; token: string }> {
  const mails = await deliverMails();
  const mail = mails.findLast(({ to }) => to.includes(email));
  const [, kind = '', token = ''] = /\/(reset|invitation)\/([\w-]+)/.exec(mail?.text ?? '') ?? [];
  return { kind, token };
}
