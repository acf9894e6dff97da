import { useQuery } from '@tanstack/react-query';
import { Link, useLocation, useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Shell } from '#client/app/shell.tsx';
import {
  ClauseConstants,
  ClauseDecisions,
} from '#client/features/library/components/clause-facts.tsx';
import { ClauseUses } from '#client/features/library/components/clause-uses.tsx';
import { FormulaLine } from '#client/features/library/components/formula-line.tsx';
import { PublishedLedger } from '#client/features/library/components/published-ledger.tsx';
import { SymbolTable } from '#client/features/library/components/symbol-table.tsx';
import { clauseUsesQuery, publishedQuery } from '#client/features/library/queries.ts';
import { Fetched } from '#client/ui/page-state.tsx';
import { Paper, PaperHead, PartHead } from '#client/ui/paper.tsx';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import { clauseNamed, clausesOf, type LibraryClause } from '#shared/library/clauses.ts';
import { NotFoundPage } from './not-found-page.tsx';

export function Component() {
  const { book = '', clause = '' } = useParams();
  const found = clauseNamed(book, clause);
  if (!found) return <NotFoundPage what="clause" />;
  return <ClausePage key={`${book} ${clause}`} clause={found} />;
}

function ClausePage({ clause }: { clause: LibraryClause }) {
  const { book, formulas } = clause;
  const { hash } = useLocation();
  const published = useQuery(publishedQuery);
  const uses = useQuery(clauseUsesQuery(book.id, clause.clause));
  const facts = (published.data?.facts ?? []).filter(
    (fact) => fact.clause.book === book.id && fact.clause.clause === clause.clause,
  );
  return (
    <Shell
      title={`${clause.reference}, ${book.name}`}
      crumbs={[
        { text: 'Library', to: paths.library },
        { text: book.name },
        { text: clause.reference },
      ]}
    >
      <Paper className="px-10 pt-9 pb-14">
        <PaperHead
          title={`${clause.reference} ${clause.title}`}
          sub={`${book.name} as engine ${ENGINE_VERSION} computes it; titles and meanings are in our own words`}
          actions={<Neighbours clause={clause} />}
        />
        <div className="grid gap-x-10 lg:grid-cols-[minmax(0,1fr)_404px]">
          <section aria-label="Formulas" className="-mx-6 pt-3">
            {formulas.map((formula) => (
              <FormulaLine
                key={formula.id}
                formula={formula}
                chosen={hash === `#${encodeURIComponent(formula.id)}`}
              />
            ))}
            <ClauseDecisions facts={facts} />
          </section>
          <section
            aria-label="Symbols and constants"
            className="pt-4 lg:border-l lg:border-zinc-2 lg:pl-8"
          >
            <SymbolTable formulas={formulas} />
            <ClauseConstants facts={facts} />
          </section>
        </div>
        <Fetched query={published} what="published values">
          {({ values }) => <PublishedLedger clause={clause} values={values} />}
        </Fetched>
        <section aria-labelledby="uses">
          <PartHead id="uses" title="Used in your calculations" />
          <Fetched query={uses} what="lines that use the clause">
            {({ members, total }) => (
              <ClauseUses formulas={formulas} members={members} total={total} />
            )}
          </Fetched>
        </section>
      </Paper>
    </Shell>
  );
}

function Neighbours({ clause }: { clause: LibraryClause }) {
  const all = clausesOf(clause.book);
  const at = all.findIndex((one) => one.clause === clause.clause);
  const [before, after] = [all[at - 1], all[at + 1]];
  return (
    <nav aria-label="Neighbouring clauses" className="flex gap-5 pb-0.5 font-condensed">
      {before && (
        <Link to={paths.clause(before.book.id, before.clause)} className="link">
          before: {before.reference}
        </Link>
      )}
      {after && (
        <Link to={paths.clause(after.book.id, after.clause)} className="link">
          after: {after.reference}
        </Link>
      )}
    </nav>
  );
}
