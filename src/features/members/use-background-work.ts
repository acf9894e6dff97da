import { useCallback, useEffect, useMemo, useRef, useState } from 'react';
import { type News, type Order, startWork } from './background-work.ts';

export interface BackgroundWork<T> {
  readonly state: 'waiting' | 'working' | 'done' | 'stopped' | 'failed';
  /** As far as it has come. */
  readonly result: T;
  readonly stop: () => void;
  readonly again: () => void;
}

/** Typing rests this long before work begins. */
const PAUSE = 300;

/**
 * Works an order out beside the page, anew with each that is another; null: there is nothing to do.
 * `nothing` and `take` are the same in every call.
 */
export function useBackgroundWork<T>(
  order: Order | null,
  nothing: T,
  take: (was: T, news: News) => T,
): BackgroundWork<T> {
  type Progress = Pick<BackgroundWork<T>, 'state' | 'result'> & { readonly key: string | null };
  const key = useMemo(() => order && JSON.stringify(order), [order]);
  const [round, setRound] = useState(0);
  const [progress, setProgress] = useState<Progress>({ state: 'waiting', result: nothing, key });
  const end = useRef<() => void>(() => {});
  // biome-ignore lint/correctness/useExhaustiveDependencies: another round is the same work again
  useEffect(() => {
    setProgress({ state: 'waiting', result: nothing, key });
    if (key === null) return;
    const timer = window.setTimeout(() => {
      setProgress({ state: 'working', result: nothing, key });
      end.current = startWork(
        JSON.parse(key) as Order,
        (news) =>
          setProgress((was) => ({
            ...was,
            ...(news.kind === 'done' ? { state: 'done' } : { result: take(was.result, news) }),
          })),
        () => setProgress({ state: 'failed', result: nothing, key }),
      );
    }, PAUSE);
    return () => {
      window.clearTimeout(timer);
      end.current();
    };
  }, [key, round]);
  const stop = useCallback(() => {
    end.current();
    setProgress((was) => (was.state === 'working' ? { ...was, state: 'stopped' } : was));
  }, []);
  const again = useCallback(() => setRound((was) => was + 1), []);
  // What was worked out for other inputs is not shown for these, not even for one drawing.
  return progress.key === key
    ? { state: progress.state, result: progress.result, stop, again }
    : { state: 'waiting', result: nothing, stop, again };
}
