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

/** What waits for this person, worst first. */
export function WaitingList({ items }: { items: readonly WaitingItem[] }) {
  if (items.length === 0) {
    return (
      <Empty>Nothing waits for you: your members are within their limits and confirmed.</Empty>
    );
  }
  return (
    <ul className="border-t-2 border-ink">
      {items.map((item) => (
        <li
          key={`${item.member.id}${item.reason}`}
          className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-4 border-b border-zinc-2 py-2"
        >
          <Link
            to={paths.member(item.calculation.id, item.member.id)}
            className="link font-semibold"
          >
            {item.member.mark || 'without a mark'}
            {item.member.section && ` · ${sectionName(item.member.section)}`}
          </Link>
          <span
            className={item.reason === 'unconfirmed' ? 'text-zinc-7' : 'font-semibold text-oxide'}
          >
            {says[item.reason](item)}
          </span>
          <span className="font-condensed text-small text-zinc-7">
            {item.calculation.number} {item.calculation.title}
          </span>
        </li>
      ))}
    </ul>
  );
}
