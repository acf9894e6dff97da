import { AppError } from './app-error.ts';

/** Does what one person asks for one after another; other people's turns go beside. */
export type TakeTurn = <T>(person: string, work: () => Promise<T>) => Promise<T>;

const mostWaiting = 20;

/**
 * A change holds a connection to the database while its members are run: without turns a few dozen
 * requests of one person would hold them all. Throws `too-many` where too many of theirs wait.
 */
export function makeTurns(): TakeTurn {
  const queues = new Map<string, { length: number; last: Promise<unknown> }>();
  return async (person, work) => {
    const queue = queues.get(person) ?? { length: 0, last: Promise.resolve() };
    if (queue.length >= mostWaiting) {
      const detail = 'Too many changes of yours wait to be saved.';
      throw new AppError('too-many', { retryAfter: 5, detail });
    }
    queues.set(person, queue);
    queue.length += 1;
    const turn = queue.last.then(work);
    queue.last = turn.catch(() => {});
    try {
      return await turn;
    } finally {
      queue.length -= 1;
      if (queue.length === 0) queues.delete(person);
    }
  };
}
