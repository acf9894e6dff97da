import { useEffect, useRef } from 'react';
import { Button } from '#client/ui/button.tsx';
import { Note } from '#client/ui/note.tsx';
import type { RunSection, SectionSearch } from '#shared/members/find-sections.ts';
import type { SearchFamily } from '#shared/members/section-candidates.ts';
import { printedDesignation } from '#shared/sections/table.ts';
import { familyWords } from '../finder-words.ts';
import type { Finder } from '../use-finder.ts';

/** How far the search is, how it ended, and what stood in its way. */
export function FinderProgress(props: {
  finder: Finder;
  family: SearchFamily;
  material: string;
  /** Where the focus goes when its own button goes away. */
  onLeave: () => void;
}) {
  const { finder, material } = props;
  const { state, result: search } = finder;
  const { many } = familyWords[props.family];
  const button = useRef<HTMLButtonElement>(null);
  const hadFocus = useRef(false);
  hadFocus.current = button.current !== null && document.activeElement === button.current;
  const { onLeave } = props;
  useEffect(() => {
    if (state === 'done' && hadFocus.current) onLeave();
  }, [state, onLeave]);
  const busy = state === 'waiting' || state === 'working';
  const share = search ? (100 * search.tried) / search.of : 0;
  return (
    <div className="mt-4 mb-1">
      <div className="flex min-h-8 items-center justify-between gap-4">
        <p className="figures" {...(busy ? {} : { role: 'status' })}>
          {busy
            ? search
              ? `Searching: ${triedText(search, many)}`
              : 'Searching …'
            : ended(finder, many)}
        </p>
        {busy && (
          <Button ref={button} size="small" onClick={finder.stop} disabled={state === 'waiting'}>
            Stop
          </Button>
        )}
        {state === 'stopped' && (
          <Button size="small" onClick={finder.again}>
            Search again
          </Button>
        )}
      </div>
      <div className="h-0.5 bg-zinc-2" aria-hidden="true">
        {busy && <div className="h-full bg-ink" style={{ width: `${share}%` }} />}
      </div>
      {!busy && search && <Obstacles search={search} material={material} />}
    </div>
  );
}

const triedText = ({ tried, of, found }: SectionSearch, many: string): string =>
  `${tried} of ${of} ${many} tried, ${found.length} satisfy every check`;

function ended({ state, result: search }: Finder, many: string): string {
  if (!search) return state === 'stopped' ? 'Stopped.' : `No ${many} are within these limits.`;
  if (state === 'stopped') return `Stopped: ${triedText(search, many)}.`;
  const { tried, of, found } = search;
  if (found.length === 0) return `None of the ${of} ${many} satisfies every check.`;
  const rest = tried < of ? ` The ${of - tried} others are heavier and were not tried.` : '';
  return `${tried} of ${of} ${many} tried, the lightest first; ${found.length} satisfy every check.${rest}`;
}

/** What keeps sections from counting, and what holds with those that do. */
function Obstacles({ search, material }: { search: SectionSearch; material: string }) {
  const { nearest, found, unchecked } = search;
  return (
    <div className="mt-2.5 grid max-w-[92ch] gap-2 empty:hidden">
      {nearest && <Note tone="asks">{nearestText(nearest)}</Note>}
      {unchecked > 0 && (
        <Note tone={found.length === 0 ? 'asks' : 'plain'}>{uncheckedText(search)}</Note>
      )}
      {found.some(({ otherSteel }) => otherSteel) && (
        <Note tone="asks">
          {material} is not made as such sections. What is found holds for the lowest yield stress
          of the grade; choose a steel that is, and the search begins again.
        </Note>
      )}
    </div>
  );
}

function nearestText({ designation, summary }: RunSection): string {
  const verdict = [summary.verdict, summary.ratioText].filter(Boolean).join(' ');
  const under = summary.governing?.combinationName;
  return `The nearest is ${printedDesignation(designation)}: ${verdict}${under ? ` under ${under}` : ''}.`;
}

/** Sections that end without a ratio never count as satisfying: how many, and the reason met last. */
function uncheckedText({ unchecked, tried, obstacle }: SectionSearch): string {
  const which =
    unchecked === tried ? 'No section tried has' : `${unchecked} of the ${tried} tried do not have`;
  return `${which} a ratio${obstacle ? `, the last because of: ${obstacle}` : ''}. Without one a section does not count.`;
}
