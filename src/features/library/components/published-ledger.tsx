import { count } from '#client/lib/count.ts';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { PartHead } from '#client/ui/paper.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import { ENGINE_VERSION } from '#shared/calc/engine.ts';
import type { Formula } from '#shared/calc/formula.ts';
import { besidePrinted, differenceText, roundsToPrinted } from '#shared/library/agreement.ts';
import type { LibraryClause } from '#shared/library/clauses.ts';
import type { PublishedValue } from '#shared/library/published-values.ts';
import { shortNameOf } from '#shared/library/show-formula.ts';

/** Published values that a clause meets: its own lines first, then what follows from them. */
export function PublishedLedger(props: {
  clause: LibraryClause;
  values: readonly PublishedValue[];
}) {
  const { book, clause, formulas } = props.clause;
  const ids = new Set(formulas.map(({ id }) => id));
  const isOwn = (value: PublishedValue) =>
    value.clause?.book === book.id && value.clause.clause === clause;
  const own = props.values.filter(isOwn);
  const after = props.values.filter(
    (value) => !isOwn(value) && value.formulas.some((id) => ids.has(id)),
  );
  const met = [...own, ...after];
  const sources = [...new Map(met.map(({ source }) => [source.title, source])).values()];
  return (
    <section aria-labelledby="published">
      <PartHead id="published" title="Beside published and reference values" />
      {met.length === 0 && (
        <Empty>
          No published example that this program runs comes to this clause. Its formulas are tested
          against values worked by hand or found by another route.
        </Empty>
      )}
      {own.length > 0 && (
        <Values values={own} caption="Values of this clause" formulas={formulas} />
      )}
      {after.length > 0 && (
        <details className="mt-3" open={own.length === 0}>
          <summary className="link w-fit">
            {count(after.length, 'value')} that follow from this clause
          </summary>
          <div className="mt-2">
            <Values
              values={after}
              caption="Values that follow from this clause"
              formulas={formulas}
            />
          </div>
        </details>
      )}
      {met.length > 0 && (
        <p className="mt-3 max-w-[88ch] text-small text-zinc-7">
          {sources.map(({ title, edition }) => `${title}. ${edition}. `)}
          What stands under “here” is computed as you read, by engine {ENGINE_VERSION} in this page,
          from the inputs of each example, and shown with two digits more than the source prints.
        </p>
      )}
    </section>
  );
}

function Values(props: {
  values: readonly PublishedValue[];
  caption: string;
  formulas: readonly Formula[];
}) {
  return (
    <Ledger
      caption={props.caption}
      className="figures"
      head={
        <>
          <HeadCell className="w-[15%]">Example</HeadCell>
          <HeadCell className="w-[26%]">Value</HeadCell>
          <HeadCell className="w-[11%]">Through</HeadCell>
          <HeadCell className="w-[6%]">Design</HeadCell>
          <HeadCell className="text-right">Source</HeadCell>
          <HeadCell className="text-right">Here</HeadCell>
          <HeadCell className="w-[8%] text-right">Difference</HeadCell>
          <HeadCell className="w-[18%] pr-0">To the last digit</HeadCell>
        </>
      }
    >
      {props.values.map((value) => (
        <ValueRow
          key={`${value.example} ${value.what} ${value.design} ${value.printed} ${value.unit}`}
          value={value}
          formulas={props.formulas}
        />
      ))}
    </Ledger>
  );
}

function ValueRow({ value, formulas }: { value: PublishedValue; formulas: readonly Formula[] }) {
  const { example, what, design, printed, unit, computed } = value;
  return (
    <Row data-published={example}>
      <RowHead className="py-1.5">{example}</RowHead>
      <Cell className="py-1.5 font-sans text-small">{what}</Cell>
      <Cell className="py-1.5 text-zinc-7">{throughOf(value, formulas)}</Cell>
      <Cell className="py-1.5 text-zinc-7">{design ?? 'both'}</Cell>
      <Cell className="py-1.5 text-right whitespace-nowrap">
        {printed} {unit}
      </Cell>
      <Cell className="py-1.5 text-right font-semibold whitespace-nowrap" data-computed>
        {besidePrinted(computed, printed)} <span className="font-normal">{unit}</span>
      </Cell>
      <Cell className="py-1.5 text-right whitespace-nowrap">
        {differenceText(computed, printed)}
      </Cell>
      <Cell className="py-1.5 pr-0 text-small text-zinc-7">
        <Agreement value={value} />
      </Cell>
    </Row>
  );
}

/** Equations of the clause that the value comes through. */
function throughOf(value: PublishedValue, formulas: readonly Formula[]): string {
  const through = value.formulas.flatMap((id) => formulas.find((one) => one.id === id) ?? []);
  return [...new Set(through.map(shortNameOf))].join(', ');
}

function Agreement({ value: { computed, printed, rounding } }: { value: PublishedValue }) {
  if (roundsToPrinted(computed, printed)) return 'agrees';
  if (rounding !== null) return `no: ${rounding}`;
  return <strong className="text-oxide">no</strong>;
}
