import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { count } from '#client/lib/count.ts';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { PartHead } from '#client/ui/paper.tsx';
import { clausesOf, type LibraryClause } from '#shared/library/clauses.ts';
import type { Book } from '#shared/standards/book.ts';

/** A book with its clauses in the standard's order. */
export function ClauseIndex({ book }: { book: Book }) {
  return (
    <section aria-label={book.name}>
      <PartHead title={book.name} />
      <p className="-mt-1.5 mb-3 text-zinc-7">{book.title}</p>
      <Ledger
        caption={`Clauses of ${book.name}`}
        head={
          <>
            <HeadCell className="w-[12%]">Clause</HeadCell>
            <HeadCell className="w-[46%]">About</HeadCell>
            <HeadCell>Equations</HeadCell>
          </>
        }
      >
        {clausesOf(book).map((clause) => (
          <Row key={clause.clause}>
            <RowHead>
              <Link to={paths.clause(book.id, clause.clause)} className="link">
                {clause.reference}
              </Link>
            </RowHead>
            <Cell className="font-sans">{clause.title}</Cell>
            <Cell className="text-zinc-7">{equationsOf(clause)}</Cell>
          </Row>
        ))}
      </Ledger>
    </section>
  );
}

function equationsOf({ formulas }: LibraryClause): string {
  const numbers = [...new Set(formulas.flatMap(({ equation }) => equation ?? []))];
  const others = formulas.filter(({ equation }) => equation === null).length;
  if (others === 0) return numbers.join(', ');
  const without = `${numbers.length > 0 ? 'and ' : ''}${count(others, 'formula')} without a number`;
  return [numbers.join(', '), without].filter(Boolean).join(' ');
}
