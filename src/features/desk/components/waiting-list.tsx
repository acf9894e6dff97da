import { useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { Empty } from '#client/ui/state-panels.tsx';
import type { WaitingItem } from '#shared/contracts/desk.ts';

const says: Record<WaitingItem['reason'], (item: WaitingItem) => string> = {
  failed: () => 'FAILED, unstable or not computable',
  'over-limit': ({ ratioText }) => `NOT OK ${ratioText ?? ''}`.trim(),
  'not-checked': () => 'NOT CHECKED, a part lies outside the scope',
  invalid: (item) => `${count(item.count, 'input')} to be corrected`,
  unconfirmed: (item) => `${count(item.count, 'input')} not confirmed`,
};

/** What waits for this person, worst first; a member stands once, with all it waits for. */
export function WaitingList(props: { items: readonly WaitingItem[]; designs: boolean }) {
  const { items } = props;
  const [all, setAll] = useState(false);
  if (items.length === 0) {
    return (
      <Empty>
        {props.designs
          ? 'Nothing waits for you: your members are within their limits and confirmed.'
          : 'Nothing waits for you. What a calculation still lacks waits for its engineer.'}
      </Empty>
    );
  }
  const members = byMember(items);
  const more = members.length - FIRST;
  return (
    <>
      <ul className="border-t-2 border-ink">
        {(all ? members : members.slice(0, FIRST)).map(([first, ...others]) => (
          <li
            key={first.member.id}
            className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4 border-b border-zinc-2 py-2"
          >
            <Link
              to={paths.member(first.calculation.id, first.member.id)}
              className="link w-fit font-semibold"
            >
              {first.member.mark || 'without a mark'}
              {first.member.section && ` · ${sectionName(first.member.section)}`}
            </Link>
            <Reason item={first} />
            <span className="font-condensed text-small text-zinc-7">
              {first.calculation.number} {first.calculation.title}
            </span>
            <span className="text-right text-small">
              {others.map((item) => (
                <Reason key={item.reason} item={item} />
              ))}
            </span>
          </li>
        ))}
      </ul>
      {!all && more > 0 && (
        <button type="button" className="link mt-2" onClick={() => setAll(true)}>
          {count(more, 'more member')}
        </button>
      )}
    </>
  );
}

/** How many members the list begins with; the calculations stay within reach under it. */
const FIRST = 10;

const Reason = ({ item }: { item: WaitingItem }) => (
  <span
    className={
      item.reason === 'unconfirmed'
        ? 'text-right text-zinc-7'
        : 'text-right font-semibold text-oxide'
    }
  >
    {says[item.reason](item)}
  </span>
);

type ItemsOfMember = [WaitingItem, ...WaitingItem[]];

/** The items of each member together, in the order of their worst. */
function byMember(items: readonly WaitingItem[]): ItemsOfMember[] {
  const groups = new Map<string, ItemsOfMember>();
  for (const item of items) {
    const group = groups.get(item.member.id);
    if (group) group.push(item);
    else groups.set(item.member.id, [item]);
  }
  return [...groups.values()];
}
