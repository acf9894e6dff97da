import { inputOf } from '#shared/contracts/draft-input.ts';
import { findSections } from '#shared/members/find-sections.ts';
import { parseInput } from '#shared/members/parse-input.ts';
import { candidatesOf } from '#shared/members/section-candidates.ts';
import type { FindOrder, News, Order } from './background-work.ts';
import { memberVerdict } from './member-verdict.ts';

/** The other thread of the page: works out one order and says how far it has come. */

const wanted = 10;
/** Milliseconds between what is said of a search. */
const every = 80;

const say = (news: News): void => self.postMessage(news);

function find({ basis, id, draft, family, limits }: FindOrder): void {
  const inputWith = (text: string) =>
    parseInput(inputOf(basis, [{ id, draft: { ...draft, section: { ...draft.section, text } } }]));
  let said = 0;
  let unsaid: News | null = null;
  for (const search of findSections(candidatesOf(family, limits), wanted, inputWith)) {
    unsaid = { kind: 'search', search };
    if (performance.now() - said < every) continue;
    say(unsaid);
    unsaid = null;
    said = performance.now();
  }
  if (unsaid) say(unsaid);
}

self.addEventListener('message', ({ data }: MessageEvent<Order>) => {
  if (data.task === 'find') find(data);
  else
    for (const member of data.members)
      say({ kind: 'verdict', id: member.id, verdict: memberVerdict(data.basis, member) });
  say({ kind: 'done' });
});
