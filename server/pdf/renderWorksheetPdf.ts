import path from 'node:path';
import { Worker } from 'node:worker_threads';
import { tookTooLong } from '../problem';
import type { PdfInput, PdfLanguage } from './input';
import type { PdfAnswer, PdfTask } from './worker';

/** A record that takes longer is not printed: 503, and the worker is ended. */
const LIMIT_MS = 20_000;
/** Setting type takes a whole core; more at once would only slow each other down. */
const WORKERS = 2;

interface Job {
  task: PdfTask;
  resolve: (bytes: Buffer) => void;
  reject: (error: Error) => void;
}

/** One thread, which takes one task at a time. */
class PdfWorker {
  private readonly thread = new Worker(path.join(import.meta.dirname, 'boot.mjs'));
  private job: Job | null = null;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private ready = false;
  alive = true;

  constructor(private readonly onFree: () => void) {
    this.thread.on('message', (answer: PdfAnswer) => this.take(answer));
    this.thread.on('error', (error) => this.end(error));
    this.thread.on('exit', () => this.end(new Error('The PDF worker ended.')));
    // An idle worker does not keep the process alive.
    this.thread.unref();
  }

  get isFree(): boolean {
    return this.alive && this.job === null;
  }

  start(job: Job): void {
    this.job = job;
    this.thread.ref();
    this.thread.postMessage(job.task);
    // While the worker still loads its code the clock does not run.
    if (this.ready) this.startClock();
  }

  async stop(): Promise<void> {
    this.end(tookTooLong());
    await this.thread.terminate();
  }

  private startClock(): void {
    this.timer = setTimeout(() => void this.stop(), LIMIT_MS);
  }

  private take(answer: PdfAnswer): void {
    if ('ready' in answer) {
      this.ready = true;
      if (this.job) this.startClock();
      return;
    }
    const job = this.release();
    if ('bytes' in answer) job?.resolve(Buffer.from(answer.bytes));
    else job?.reject(new Error(answer.error));
    this.onFree();
  }

  private end(error: Error): void {
    this.alive = false;
    this.release()?.reject(error);
    this.onFree();
  }

  private release(): Job | null {
    clearTimeout(this.timer);
    const { job } = this;
    this.job = null;
    if (this.alive) this.thread.unref();
    return job;
  }
}

let workers: PdfWorker[] = [];
const waiting: Job[] = [];

function next(): void {
  workers = workers.filter(({ alive }) => alive);
  while (waiting.length > 0) {
    let worker = workers.find(({ isFree }) => isFree);
    if (worker === undefined) {
      if (workers.length >= WORKERS) return;
      worker = new PdfWorker(next);
      workers.push(worker);
    }
    const job = waiting.shift();
    if (job) worker.start(job);
  }
}

/**
 * The printed record of one revision: a tagged PDF/A-3a with the signed content
 * attached. The same input gives the same bytes. Rejects with the problem
 * `took-too-long` after 20 s.
 */
export function renderWorksheetPdf(input: PdfInput, language: PdfLanguage): Promise<Buffer> {
  return new Promise((resolve, reject) => {
    waiting.push({ task: { input, language }, resolve, reject });
    next();
  });
}

/** Loads the first worker ahead of the first request. */
export function warmPdfWorker(): void {
  if (workers.length === 0) workers.push(new PdfWorker(next));
}

/** Ends all workers; what still runs is refused. */
export async function stopPdfWorkers(): Promise<void> {
  const all = workers;
  workers = [];
  await Promise.all(all.map((worker) => worker.stop()));
}
