import { paths } from '#client/app/paths.ts';
import { Shell } from '#client/app/shell.tsx';
import { ClauseIndex } from '#client/features/library/components/clause-index.tsx';
import { FormulaResults } from '#client/features/library/components/formula-results.tsx';
import {
  FormulaSearch,
  useFormulaQuery,
} from '#client/features/library/components/formula-search.tsx';
import { Paper, PaperHead } from '#client/ui/paper.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import { searchFormulas } from '#shared/library/search-formulas.ts';
import { BOOKS } from '#shared/standards/library.ts';

export function Component() {
  const [query, setQuery] = useFormulaQuery();
  const found = searchFormulas(query);
  return (
    <Shell title="Library" crumbs={[{ text: 'Desk', to: paths.desk }, { text: 'Library' }]}>
      <Paper className="px-10 pt-9 pb-14">
        <PaperHead
          title="Library"
          sub="The books that calculations are run on: every formula as it stands in the program, beside published values, with the lines of your calculations that use it"
        />
        <FormulaSearch query={query} found={found} onQuery={setQuery} />
        {query.trim() === '' ? (
          BOOKS.map((book) => <ClauseIndex key={book.id} book={book} />)
        ) : found.length > 0 ? (
          <FormulaResults formulas={found} />
        ) : (
          <div className="mt-4">
            <Empty>
              No formula of the books has all of these words as its equation number, clause, symbol
              or in its title.
            </Empty>
          </div>
        )}
      </Paper>
    </Shell>
  );
}
