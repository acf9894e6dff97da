import { Worker } from 'node:worker_threads';
import type { TaskName, Tasks } from './tasks.ts';

interface Pending {
  readonly resolve: (made: unknown) => void;
  readonly reject: (error: unknown) => void;
}

type Answer = { number: number; made: unknown } | { number: number; error: unknown };

/** Longer than any report of 500 members takes; then the thread is given up. */
const patience = 10 * 60_000;

/**
 * A thread that computes, so that the web process goes on answering. It starts with the first
 * order; if it dies, what it had before it fails and the next order starts another one.
 */
export class RunThread {
  private worker: Worker | null = null;
  private readonly pending = new Map<number, Pending>();
  private number = 0;

  /** Has a thing made. Rejects with what the making threw. */
  async make<Name extends TaskName>(
    task: Name,
    given: Tasks[Name]['given'],
  ): Promise<Tasks[Name]['made']> {
    const worker = this.started();
    this.number += 1;
    const { number } = this;
    const made = new Promise<unknown>((resolve, reject) => {
      this.pending.set(number, { resolve, reject });
    });
    worker.ref();
    worker.postMessage({ number, order: { task, given } });
    const timer = setTimeout(() => void worker.terminate(), patience);
    timer.unref();
    try {
      // What a task makes is what `make` in the thread returns for it.
      return (await made) as Tasks[Name]['made'];
    } finally {
      clearTimeout(timer);
      this.pending.delete(number);
      if (this.pending.size === 0) worker.unref();
    }
  }

  async close(): Promise<void> {
    await this.worker?.terminate();
  }

  private started(): Worker {
    if (this.worker) return this.worker;
    const url = new URL('./start-run-thread.mjs', import.meta.url);
    const worker = new Worker(url, { execArgv: [] });
    worker.on('message', (answer: Answer) => {
      const waiting = this.pending.get(answer.number);
      if ('error' in answer) waiting?.reject(answer.error);
      else waiting?.resolve(answer.made);
    });
    const gone = (error: unknown) => {
      if (this.worker === worker) this.worker = null;
      for (const { reject } of this.pending.values()) reject(error);
      this.pending.clear();
    };
    worker.on('error', gone);
    worker.on('exit', () => gone(new Error('the computing thread has ended')));
    this.worker = worker;
    return worker;
  }
}
