import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { MemberDraft } from '#shared/contracts/members.ts';
import type { OrderedBy } from './orders.ts';
import { RunThread } from './run-thread-client.ts';
import type { Drafts, SummarisedMember, Tasks } from './tasks.ts';
import { tooLarge } from './too-large.ts';

/** Everything that is computed of a calculation on the server. */
export interface Runs {
  summarise(basis: BasisDraft, id: string, draft: MemberDraft): Promise<SummarisedMember>;
  record(drafts: Drafts, by: OrderedBy): Promise<Tasks['record']['made']>;
  document(given: Tasks['document']['given'], by: OrderedBy): Promise<Tasks['document']['made']>;
  report(given: Tasks['report']['given'], by: OrderedBy): Promise<Tasks['report']['made']>;
  close(): Promise<void>;
}

/** One thread for what someone waits for while typing, one for what takes seconds. */
export function makeRuns(): Runs {
  const short = new RunThread();
  const long = new RunThread();
  return {
    async summarise(basis, id, draft) {
      const [summarised] = await short.make('summaries', { basis, members: [{ id, draft }] });
      if (!summarised) throw new Error('a member was given and none was summarised');
      return summarised;
    },
    record: async (drafts, by) => tooLarge(drafts) ?? long.make('record', drafts, by),
    document: async (given, by) => tooLarge(given.drafts) ?? long.make('document', given, by),
    report: async (given, by) => tooLarge(given.drafts) ?? long.make('report', given, by),
    close: async () => {
      await Promise.all([short.close(), long.close()]);
    },
  };
}
