import { type KeyboardEvent, useRef } from 'react';
import { classNames } from '#client/ui/class-names.ts';
import { Keycap } from '#client/ui/keycap.tsx';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { RatioBar } from '#client/ui/ratio-bar.tsx';
import { Tag } from '#client/ui/tag.tsx';
import { VerdictText } from '#client/ui/verdict.tsx';
import { printedDesignation } from '#shared/sections/table.ts';
import { type FinderRow, sizeText, weightAgainst } from '../finder-rows.ts';

/** Sections by weight; arrows move along those that can be taken, Enter takes one. */
export function FinderTable(props: {
  rows: readonly FinderRow[];
  units: 'us' | 'si';
  /** null: it may only be read. */
  onTake: ((designation: string) => void) | null;
}) {
  const { rows, units, onTake } = props;
  const body = useRef<HTMLDivElement>(null);
  const present = rows.find(({ isPresent }) => isPresent);
  const onKeyDown = (event: KeyboardEvent) => {
    const buttons = [...(body.current?.querySelectorAll('button') ?? [])];
    const at = buttons.indexOf(document.activeElement as HTMLButtonElement);
    const to = { ArrowDown: at + 1, ArrowUp: at - 1, Home: 0, End: buttons.length - 1 }[event.key];
    if (at < 0 || to === undefined) return;
    event.preventDefault();
    buttons[Math.max(0, Math.min(buttons.length - 1, to))]?.focus();
  };
  return (
    <>
      {/* biome-ignore lint/a11y/noStaticElementInteractions: arrow keys move between the buttons in it */}
      <div ref={body} onKeyDown={onKeyDown}>
        <Ledger
          caption="Sections that satisfy every check, by weight"
          head={
            <>
              <HeadCell className="pl-2">Section</HeadCell>
              <HeadCell className="text-right">lb/ft</HeadCell>
              {present && (
                <HeadCell className="text-right">
                  against {printedDesignation(present.designation)}
                </HeadCell>
              )}
              <HeadCell className="text-right">Depth</HeadCell>
              <HeadCell className="text-right">Width</HeadCell>
              <HeadCell className="w-[20%] pl-3">Ratio</HeadCell>
              <HeadCell className="text-right">Verdict</HeadCell>
              <HeadCell>Governs</HeadCell>
            </>
          }
        >
          {rows.map((row) => (
            <Row
              key={row.designation}
              className={classNames(
                'focus-within:bg-oxide-2',
                row.isPresent && 'bg-zinc-1 focus-within:bg-oxide-2',
              )}
            >
              <RowHead className="pl-2 whitespace-nowrap">
                <span className="flex items-baseline gap-2">
                  {row.isFound && onTake ? (
                    <button
                      type="button"
                      className="link figures"
                      aria-label={`${row.isPresent ? 'Present section' : 'Take'} ${printedDesignation(row.designation)}`}
                      onClick={() => onTake(row.designation)}
                    >
                      {printedDesignation(row.designation)}
                    </button>
                  ) : (
                    <span className="figures">{printedDesignation(row.designation)}</span>
                  )}
                  {row.isPresent && <Tag>present</Tag>}
                </span>
              </RowHead>
              <Cell className="figures text-right">{row.weight}</Cell>
              {present && (
                <Cell className="figures text-right text-zinc-7">
                  {row.isPresent ? '–' : weightAgainst(row.weight, present.weight)}
                </Cell>
              )}
              <Cell className="figures text-right whitespace-nowrap">
                {sizeText(row.depth, units)}
              </Cell>
              <Cell className="figures text-right whitespace-nowrap">
                {sizeText(row.width, units)}
              </Cell>
              <Cell className="pl-3 align-middle">
                {row.summary && <RatioBar ratio={row.summary.ratio} />}
              </Cell>
              <Cell className="text-right">
                {row.summary ? (
                  <VerdictText verdict={row.summary.verdict} ratioText={row.summary.ratioText} />
                ) : (
                  <span className="text-small text-zinc-7">not run</span>
                )}
              </Cell>
              <Cell>{row.summary?.governing && governs(row.summary.governing)}</Cell>
            </Row>
          ))}
        </Ledger>
      </div>
      {onTake && rows.some(({ isFound }) => isFound) && (
        <p className="mt-2.5 flex flex-wrap items-center gap-1.5 text-small text-zinc-7">
          <Keycap>↑</Keycap>
          <Keycap>↓</Keycap> along the sections, <Keycap>Enter</Keycap> takes one for the member.
        </p>
      )}
    </>
  );
}

const governs = ({
  clause,
  combinationName,
}: NonNullable<NonNullable<FinderRow['summary']>['governing']>) =>
  [clause.equation ?? clause.clause, combinationName].filter(Boolean).join(', ');
