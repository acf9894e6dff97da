import type { Response } from 'express';
import type { Viewer } from '#server/auth/viewer.ts';
import type { OrderedBy } from '#server/runs/orders.ts';

/** The person who asked, for as long as they wait for the answer. */
export function orderedBy({ res, viewer }: { res: Response; viewer: Viewer }): OrderedBy {
  const gone = new AbortController();
  res.once('close', () => gone.abort());
  return { person: viewer.userId, signal: gone.signal };
}
