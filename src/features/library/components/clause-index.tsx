import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { count } from '#client/lib/count.ts';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { PartHead } from '#client/ui/paper.tsx';
import type { LibraryClause } from '#shared/library/clauses.ts';
import { type ContentsEntry, contentsOf } from '#shared/library/contents.ts';
import { clauseText } from '#shared/report/reference-text.ts';
import type { Book } from '#shared/standards/book.ts';

/** A book with every clause of its standard: what it has of each, or why it has nothing. */
export function ClauseIndex({ book }: { book: Book }) {
  const contents = contentsOf(book);
  return (
    <section aria-label={book.name}>
      <PartHead title={book.name} />
      <p className="-mt-1.5 mb-3 text-zinc-7">{book.title}</p>
      <Extent contents={contents} />
      <Ledger
        caption={`Clauses of ${book.name}`}
        head={
          <>
            <HeadCell className="w-[12%]">Clause</HeadCell>
            <HeadCell className="w-[40%]">About</HeadCell>
            <HeadCell>In the book</HeadCell>
          </>
        }
      >
        {contents.map((entry) => (
          <ClauseRow key={entry.clause} book={book} entry={entry} />
        ))}
      </Ledger>
    </section>
  );
}

/** How much of the standard the book has, where it does not have all. */
function Extent({ contents }: { contents: readonly ContentsEntry[] }) {
  const of = (state: ContentsEntry['state']) =>
    contents.filter((entry) => entry.state === state).length;
  if (of('implemented') === contents.length) return null;
  return (
    <p className="mb-3 max-w-[64ch] font-serif">
      Of {contents.length} clauses within reach of a member check {of('implemented')} are in the
      book. {of('outside scope')} are outside its scope and {of('not applicable')} do not apply to
      its members; each says why.
    </p>
  );
}

function ClauseRow({ book, entry }: { book: Book; entry: ContentsEntry }) {
  const { clause, title, state, because, library } = entry;
  const reference = clauseText({ book: book.id, clause, equation: null });
  if (!library)
    return (
      <Row data-state={state}>
        <RowHead className="font-normal text-zinc-7">{reference}</RowHead>
        <Cell className="font-sans text-zinc-7">{title}</Cell>
        <Cell className="text-zinc-7">
          <span className="font-semibold">{state}</span>
          {because && `: ${because}`}
        </Cell>
      </Row>
    );
  return (
    <Row data-state={state}>
      <RowHead>
        <Link to={paths.clause(book.id, clause)} className="link">
          {reference}
        </Link>
      </RowHead>
      <Cell className="font-sans">{title}</Cell>
      <Cell>
        {equationsOf(library)}
        {because && <span className="block text-zinc-7">{because}</span>}
      </Cell>
    </Row>
  );
}

function equationsOf({ formulas }: LibraryClause): string {
  const numbers = [...new Set(formulas.flatMap(({ equation }) => equation ?? []))];
  const others = formulas.filter(({ equation }) => equation === null).length;
  if (others === 0) return numbersText(numbers);
  const without = `${numbers.length > 0 ? 'and ' : ''}${count(others, 'formula')} without a number`;
  return [numbersText(numbers), without].filter(Boolean).join(' ');
}

/** `E3-1, E3-2`; of a table its rows under its name: `Table B4.1a, 1, 2, 5; Table B4.1b, 10`. */
function numbersText(numbers: readonly string[]): string {
  const rows = new Map<string, string[]>();
  for (const number of numbers) {
    const [, table = '', row = number] = /^(Table .+), (\S+)$/.exec(number) ?? [];
    rows.set(table, [...(rows.get(table) ?? []), row]);
  }
  return [...rows].map(([table, found]) => [table, ...found].filter(Boolean).join(', ')).join('; ');
}
