import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { DraftOfMember } from '#shared/contracts/draft-input.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import type { SectionSearch } from '#shared/members/find-sections.ts';
import type { SearchFamily, SizeLimits } from '#shared/members/section-candidates.ts';
import type { MemberVerdict } from './member-verdict.ts';

/** The lightest sections for a member; the draft's own section plays no part. */
export interface FindOrder {
  readonly task: 'find';
  readonly basis: BasisDraft;
  readonly id: string;
  readonly draft: MemberDraft;
  readonly family: SearchFamily;
  readonly limits: SizeLimits;
}

/** The verdict of each of some members, one after another. */
export interface VerdictsOrder {
  readonly task: 'verdicts';
  readonly basis: BasisDraft;
  readonly members: readonly DraftOfMember[];
}

export type Order = FindOrder | VerdictsOrder;

/** What comes back of an order; `done` is the last. */
export type News =
  | { readonly kind: 'search'; readonly search: SectionSearch }
  | { readonly kind: 'verdict'; readonly id: string; readonly verdict: MemberVerdict }
  | { readonly kind: 'done' };

/**
 * Has an order worked out in a thread of its own, so that the page goes on answering. `failed` is
 * called where the thread cannot start or breaks. Gives what stops the work at once.
 */
export function startWork(
  order: Order,
  heard: (news: News) => void,
  failed: () => void,
): () => void {
  const worker = new Worker(new URL('./background-thread.ts', import.meta.url), {
    type: 'module',
  });
  worker.addEventListener('message', ({ data }: MessageEvent<News>) => {
    if (data.kind === 'done') worker.terminate();
    heard(data);
  });
  worker.addEventListener('error', (event) => {
    event.preventDefault();
    worker.terminate();
    failed();
  });
  worker.postMessage(order);
  return () => worker.terminate();
}
