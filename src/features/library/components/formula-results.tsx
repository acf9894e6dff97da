import { useState } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Formula as FormulaMark } from '#client/document/formula.tsx';
import { count } from '#client/lib/count.ts';
import type { Formula } from '#shared/calc/formula.ts';
import { showFormula } from '#shared/library/show-formula.ts';
import { clauseText } from '#shared/report/reference-text.ts';
import { bookNamed } from '#shared/standards/library.ts';

const FIRST = 30;

/** What a search found, as lines of a sheet; each leads to its clause. */
export function FormulaResults({ formulas }: { formulas: readonly Formula[] }) {
  const [all, setAll] = useState(false);
  const more = formulas.length - FIRST;
  return (
    <>
      <ul className="mt-4 -mx-6 before:mx-6 before:block before:border-t-2 before:border-ink">
        {(all ? formulas : formulas.slice(0, FIRST)).map((formula) => (
          <Result key={formula.id} formula={formula} />
        ))}
      </ul>
      {!all && more > 0 && (
        <button type="button" className="link mt-3" onClick={() => setAll(true)}>
          {count(more, 'more formula')}
        </button>
      )}
    </>
  );
}

function Result({ formula }: { formula: Formula }) {
  const { id, book, clause, equation, title } = formula;
  const { tex, text } = showFormula(formula);
  return (
    <li className="sheet-line" data-formula={id}>
      <div className="line-reference">
        <span className="line-number">{equation ?? ''}</span>
        <span className="line-clause text-zinc-7">{clauseText({ book, clause, equation })}</span>
      </div>
      <p className="line-title">
        <Link to={paths.clause(book, clause, id)} className="link text-ink">
          {title}
        </Link>
      </p>
      <div className="line-working">
        <FormulaMark tex={tex} className="line-step" />
        <span className="sr-only">{text}</span>
      </div>
      <span className="line-result line-unit font-condensed">{bookNamed(book)?.name}</span>
    </li>
  );
}
