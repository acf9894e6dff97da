import { useCallback, useMemo } from 'react';
import { useSearchParams } from 'react-router-dom';
import { splitAddress } from '#shared/calc/address.ts';

/** Which combination and line of the sheet the address bar points at. */
export interface SheetPlaceControl {
  readonly combination: string | null;
  readonly line: string | null;
  readonly chooseLine: (address: string) => void;
  readonly closeLine: () => void;
  readonly showCombination: (id: string) => void;
}

/** The place is kept in the address, so that it can be shared and the browser goes back along it. */
export function useSheetPlace(): SheetPlaceControl {
  const [query, setQuery] = useSearchParams();
  const line = query.get('line');
  const combination = (line && splitAddress(line).combination) ?? query.get('combination');
  const chooseLine = useCallback(
    (address: string) =>
      setQuery(
        (was) => {
          const next = new URLSearchParams(was);
          const own = splitAddress(address).combination;
          if (own) next.set('combination', own);
          next.set('line', address);
          return next;
        },
        { preventScrollReset: true },
      ),
    [setQuery],
  );
  const closeLine = useCallback(
    () =>
      setQuery(
        (was) => {
          const next = new URLSearchParams(was);
          next.delete('line');
          return next;
        },
        { preventScrollReset: true },
      ),
    [setQuery],
  );
  const showCombination = useCallback(
    (id: string) => setQuery({ combination: id }, { replace: true, preventScrollReset: true }),
    [setQuery],
  );
  return useMemo(
    () => ({ combination, line, chooseLine, closeLine, showCombination }),
    [combination, line, chooseLine, closeLine, showCombination],
  );
}
