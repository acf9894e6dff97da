import { AppError } from '#server/http/app-error.ts';
import type { Order } from './tasks.ts';

/** For whom something is computed, and the signal that they have gone. */
export interface OrderedBy {
  readonly person: string;
  readonly signal: AbortSignal;
}

export interface Waiting {
  readonly order: Order;
  readonly by: OrderedBy | undefined;
  readonly resolve: (made: unknown) => void;
  readonly reject: (error: unknown) => void;
}

/** As many as anyone orders by hand: a page, a download, and another page. */
const mostOfOne = 3;

/** Orders in the order of their coming; nobody has more than a few in it. */
export class Orders {
  private waiting: Waiting[] = [];

  /** Adds an order. Throws `too-many` where the person has enough, the one in work included. */
  add(added: Waiting, inWork: Waiting | null): void {
    const { by } = added;
    const ofPerson = [...this.waiting, ...(inWork ? [inWork] : [])].filter(
      (other) => by && other.by?.person === by.person,
    );
    if (ofPerson.length >= mostOfOne) {
      const detail = 'Wait until what you have asked for before is ready.';
      throw new AppError('too-many', { retryAfter: 5, detail });
    }
    this.waiting.push(added);
  }

  take(): Waiting | null {
    return this.waiting.shift() ?? null;
  }

  remove(left: Waiting): void {
    this.waiting = this.waiting.filter((other) => other !== left);
  }

  removeAll(): Waiting[] {
    const all = this.waiting;
    this.waiting = [];
    return all;
  }
}
