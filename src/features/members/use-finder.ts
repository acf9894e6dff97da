import { useCallback, useEffect, useRef, useState } from 'react';
import type { SectionSearch } from '#shared/members/find-sections.ts';
import { type FindOrder, startWork } from './background-work.ts';

interface Progress {
  readonly state: 'waiting' | 'searching' | 'done' | 'stopped' | 'failed';
  /** As far as it has come; null before the first section is tried. */
  readonly search: SectionSearch | null;
}

export interface Finder extends Progress {
  readonly stop: () => void;
  readonly again: () => void;
}

const nothingYet: Progress = { state: 'waiting', search: null };

/** Typing rests this long before a search begins. */
const PAUSE = 300;

/** The search for an order, begun anew with each that is another; null: there is nothing to search. */
export function useFinder(order: FindOrder | null): Finder {
  const key = order && JSON.stringify(order);
  const [round, setRound] = useState(0);
  const [progress, setProgress] = useState({ ...nothingYet, key });
  const end = useRef<() => void>(() => {});
  // biome-ignore lint/correctness/useExhaustiveDependencies: another round is another search
  useEffect(() => {
    setProgress({ ...nothingYet, key });
    if (key === null) return;
    const timer = window.setTimeout(() => {
      setProgress({ state: 'searching', search: null, key });
      end.current = startWork(
        JSON.parse(key) as FindOrder,
        (news) => {
          if (news.kind === 'search') setProgress((was) => ({ ...was, search: news.search }));
          if (news.kind === 'done') setProgress((was) => ({ ...was, state: 'done' }));
        },
        () => setProgress({ state: 'failed', search: null, key }),
      );
    }, PAUSE);
    return () => {
      window.clearTimeout(timer);
      end.current();
    };
  }, [key, round]);
  const stop = useCallback(() => {
    end.current();
    setProgress((was) => (was.state === 'searching' ? { ...was, state: 'stopped' } : was));
  }, []);
  const again = useCallback(() => setRound((was) => was + 1), []);
  // What was found for other inputs is not shown for these, not even for one drawing.
  const { state, search } = progress.key === key ? progress : nothingYet;
  return { state, search, stop, again };
}
