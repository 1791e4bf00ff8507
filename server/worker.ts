import { boss, startBoss } from './jobs';
import type { Queue } from './jobs';
import { logger } from './log';
import { expireWorksheets } from './services/expireWorksheets';
import type { MailJob } from './services/queueMail';
import { runNightly } from './services/runNightly';
import { sendMail } from './services/sendMail';

/** What each queue does with one job. Any process may run it; a job is given to one of them. */
export const handlers: Record<Queue, (data: object) => Promise<unknown>> = {
  mail: (data) => sendMail(data as MailJob),
  'expire-worksheets': () => expireWorksheets(),
  nightly: () => runNightly(),
};

/** Jobs in hand at once. Many mails wait after the mail server was away; it sees this many connections. */
const BATCH: Record<Queue, number> = { mail: 5, 'expire-worksheets': 1, nightly: 1 };

/** Takes jobs until the process ends. */
export async function startWorker(): Promise<void> {
  await startBoss();
  for (const queue of Object.keys(handlers) as Queue[]) {
    const options = { pollingIntervalSeconds: 0.5, batchSize: BATCH[queue] };
    await boss.work<object>(queue, options, async (jobs) => {
      await Promise.all(jobs.map(({ id, data }) => run(queue, id, data)));
    });
  }
  await boss.schedule('expire-worksheets', '* * * * *');
  await boss.schedule('nightly', '30 7 * * *');
}

async function run(queue: Queue, id: string, data: object): Promise<void> {
  try {
    await handlers[queue](data);
  } catch (error) {
    // The queue keeps the job and tries again; the log says that it had to. The others of its batch are done.
    const { name, message } = error instanceof Error ? error : new Error(String(error));
    logger.warn({ queue, job: id, name, message }, 'a job failed');
    await boss.fail(queue, id, { name, message });
  }
}
