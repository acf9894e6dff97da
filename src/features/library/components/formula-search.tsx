import { useState } from 'react';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { count } from '#client/lib/count.ts';
import { TextField } from '#client/ui/text-field.tsx';
import type { Formula } from '#shared/calc/formula.ts';

/** What is looked for; kept in the address too, so that the way back leads to the results. */
export function useFormulaQuery() {
  const [parameters, setParameters] = useSearchParams();
  const [query, setQuery] = useState(parameters.get('q') ?? '');
  const change = (text: string) => {
    setQuery(text);
    setParameters(text === '' ? {} : { q: text }, { replace: true });
  };
  return [query, change] as const;
}

export function FormulaSearch(props: {
  query: string;
  found: readonly Formula[];
  onQuery: (query: string) => void;
}) {
  const { query, found } = props;
  const [first] = found;
  const navigate = useNavigate();
  return (
    <search className="mt-6 flex items-end gap-x-6">
      <form
        className="w-full max-w-[460px]"
        onSubmit={(event) => {
          event.preventDefault();
          if (first) navigate(paths.clause(first.book, first.clause, first.id));
        }}
      >
        <TextField
          label="Find a formula"
          hint="By its equation number, clause, symbol, or words of its title. Enter opens the first."
          type="search"
          className="[&::-webkit-search-cancel-button]:hidden"
          autoComplete="off"
          spellCheck={false}
          value={query}
          onChange={(event) => props.onQuery(event.target.value)}
        />
      </form>
      <p role="status" className="pb-6 text-zinc-7">
        {query.trim() !== '' && (first ? count(found.length, 'formula') : 'Nothing fits.')}
      </p>
    </search>
  );
}
