import { Worker } from 'node:worker_threads';
import { type OrderedBy, Orders, type Waiting } from './orders.ts';
import type { Order, TaskName, Tasks } from './tasks.ts';

type Answer = { made: unknown } | { error: unknown };

/** Longer than the largest report takes; then the thread is given up. */
const patience = 10 * 60_000;
/** Of a thread; where it is not enough, the order fails and not the process. */
const megabytes = 2048;

const ended = () => new Error('the computing thread has ended');

/**
 * A thread that computes, so that the web process goes on answering: one order after another. It
 * starts with the first; if it dies, the order in work fails and another thread does the next.
 */
export class RunThread {
  private worker: Worker | null = null;
  private readonly orders = new Orders();
  private inWork: Waiting | null = null;
  private timer: NodeJS.Timeout | undefined;

  /**
   * Has a thing made. Rejects with what the making threw, with `too-many` where the person has
   * other orders, and with the signal's reason when they have gone.
   */
  async make<Name extends TaskName>(
    task: Name,
    given: Tasks[Name]['given'],
    by?: OrderedBy,
  ): Promise<Tasks[Name]['made']> {
    by?.signal.throwIfAborted();
    let left: (() => void) | undefined;
    const made = new Promise<unknown>((resolve, reject) => {
      // Task and what is given to it come as the pair that `Order` is.
      const ordered = { order: { task, given } as Order, by, resolve, reject };
      this.orders.add(ordered, this.inWork);
      left = () => this.forget(ordered);
      by?.signal.addEventListener('abort', left);
      this.next();
    });
    try {
      // What a task makes is what `make` in the thread returns for it.
      return (await made) as Tasks[Name]['made'];
    } finally {
      if (left) by?.signal.removeEventListener('abort', left);
    }
  }

  /** Ends the thread; what waits fails. */
  async close(): Promise<void> {
    for (const { reject } of this.orders.removeAll()) reject(ended());
    await this.worker?.terminate();
  }

  private next(): void {
    if (this.inWork) return;
    this.inWork = this.orders.take();
    if (!this.inWork) {
      this.worker?.unref();
      return;
    }
    const worker = this.started();
    worker.ref();
    this.timer = setTimeout(() => void worker.terminate(), patience).unref();
    worker.postMessage(this.inWork.order);
  }

  /** Ends the order in work by `end` and begins the next. */
  private done(end: (waiting: Waiting) => void): void {
    clearTimeout(this.timer);
    const done = this.inWork;
    this.inWork = null;
    if (done) end(done);
    this.next();
  }

  private forget(ordered: Waiting): void {
    ordered.reject(ordered.by?.signal.reason);
    if (this.inWork === ordered) void this.worker?.terminate();
    else this.orders.remove(ordered);
  }

  private started(): Worker {
    if (this.worker) return this.worker;
    const url = new URL('./start-run-thread.mjs', import.meta.url);
    const resourceLimits = { maxOldGenerationSizeMb: megabytes };
    const worker = new Worker(url, { execArgv: [], resourceLimits });
    worker.on('message', (answer: Answer) => {
      this.done(({ resolve, reject }) =>
        'error' in answer ? reject(answer.error) : resolve(answer.made),
      );
    });
    const gone = (error: unknown) => {
      if (this.worker !== worker) return;
      this.worker = null;
      this.done(({ reject }) => reject(error));
    };
    worker.on('error', gone);
    worker.on('exit', () => gone(ended()));
    this.worker = worker;
    return worker;
  }
}
