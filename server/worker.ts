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

/** Takes jobs until the process ends. */
export async function startWorker(): Promise<void> {
  await startBoss();
  for (const queue of Object.keys(handlers) as Queue[]) {
    await boss.work<object>(queue, { pollingIntervalSeconds: 1 }, async (jobs) => {
      for (const { id, data } of jobs) await run(queue, id, data);
    });
  }
  await boss.schedule('expire-worksheets', '* * * * *');
  await boss.schedule('nightly', '30 7 * * *');
}

async function run(queue: Queue, id: string, data: object): Promise<void> {
  try {
    await handlers[queue](data);
  } catch (error) {
    // The queue keeps the job and tries again; the log says that it had to.
    const { name, message } = error instanceof Error ? error : new Error(String(error));
    logger.warn({ queue, job: id, name, message }, 'a job failed');
    throw error;
  }
}
