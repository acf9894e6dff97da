import { Formula as FormulaMark } from '#client/document/formula.tsx';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import type { Formula } from '#shared/calc/formula.ts';
import { symbolsOf } from '#shared/library/show-formula.ts';

/** The symbols of a clause's formulas, with meaning and the units of both sets. */
export function SymbolTable({ formulas }: { formulas: readonly Formula[] }) {
  return (
    <Ledger
      caption="Symbols of the clause"
      head={
        <>
          <HeadCell className="w-[19%]">Symbol</HeadCell>
          <HeadCell>Meaning</HeadCell>
          <HeadCell className="w-[16%]">US</HeadCell>
          <HeadCell className="w-[16%] pr-0">SI</HeadCell>
        </>
      }
    >
      {symbolsOf(formulas).map(({ name, tex, text, meaning, units }) => (
        <Row key={name}>
          <RowHead className="py-1.5 font-normal">
            <FormulaMark tex={tex} />
            <span className="sr-only">{text}</span>
          </RowHead>
          <Cell className="py-1.5 font-sans text-small">{meaning}</Cell>
          <Cell className="py-1.5 text-zinc-7">
            <Units units={units.us} />
          </Cell>
          <Cell className="py-1.5 pr-0 text-zinc-7">
            <Units units={units.si} />
          </Cell>
        </Row>
      ))}
    </Ledger>
  );
}

/** One beside the other, each whole; a dash for a plain number. */
function Units({ units }: { units: readonly string[] }) {
  if (units.length === 0) return '–';
  return units.map((unit, index) => (
    <span key={unit} className="inline-block whitespace-nowrap">
      {unit}
      {index < units.length - 1 && ',\u00a0'}
    </span>
  ));
}
