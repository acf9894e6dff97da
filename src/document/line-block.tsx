import { memo, useEffect, useRef } from 'react';
import { same } from '#client/lib/same.ts';
import { classNames } from '#client/ui/class-names.ts';
import { SourceRing } from '#client/ui/source-ring.tsx';
import type { LineBlock as Line } from '#shared/report/tree.ts';
import { useDocument } from './document-context.ts';
import { fitWorking } from './fit-working.ts';
import { Formula } from './formula.tsx';
import { Inlines } from './inlines.tsx';

/** One line of a sheet: number and clause, title and working, result. */
export function LineBlock({ block }: { block: Line }) {
  const { chosen, lit, current, onCurrent } = useDocument();
  const { address } = block;
  return (
    <LineRow
      block={block}
      chosen={chosen === address}
      lit={lit.has(address)}
      inTabOrder={current === address}
      onCurrent={onCurrent}
    />
  );
}

interface LineRowProps {
  block: Line;
  chosen: boolean;
  lit: boolean;
  inTabOrder: boolean;
  onCurrent: ((address: string) => void) | null;
}

/** Drawn again only when something of it changed. */
const LineRow = memo(function LineRow(props: LineRowProps) {
  const { block, chosen, lit, inTabOrder, onCurrent } = props;
  return (
    // biome-ignore lint/a11y/useSemanticElements: a line is a group of what stands in its columns
    <div
      role="group"
      aria-label={`Line ${block.number}, ${block.title}: ${block.text}`}
      data-line={block.address}
      data-kind={block.lineKind}
      data-tone={block.tone}
      {...(onCurrent
        ? { tabIndex: inTabOrder ? 0 : -1, onFocus: () => onCurrent(block.address) }
        : {})}
      {...(chosen ? { 'aria-current': true as const } : {})}
      className={classNames('sheet-line', chosen && 'is-chosen', lit && 'is-lit')}
    >
      <LineReference block={block} />
      {isShort(block) ? <ShortLine block={block} /> : <LongLine block={block} />}
      <LineResult block={block} />
    </div>
  );
}, same);

/** Given and table values, and statements, take one row: nothing is worked out in them. */
const isShort = ({ lineKind, working }: Line): boolean =>
  ['given', 'statement', 'lookup'].includes(lineKind) && working.length <= 1;

function ShortLine({ block }: { block: Line }) {
  const [symbol] = block.working;
  return (
    <div className="line-short">
      <p className="line-title">
        {block.title}
        {symbol && (
          <>
            {' '}
            <Formula tex={symbol} className="text-ink" />
          </>
        )}
      </p>
      <LineWords block={block} />
    </div>
  );
}

function LongLine({ block }: { block: Line }) {
  return (
    <>
      <p className="line-title">{block.title}</p>
      {block.working.length > 0 && <Working steps={block.working} />}
      <LineWords block={block} />
    </>
  );
}

function Working({ steps }: { steps: Line['working'] }) {
  const element = useRef<HTMLDivElement>(null);
  useEffect(() => (element.current ? fitWorking(element.current) : undefined), []);
  return (
    <div ref={element} className="line-working">
      {steps.map((tex, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: the steps of a line in their order
        <Formula key={index} tex={tex} className="line-step" />
      ))}
    </div>
  );
}

function LineReference({ block }: { block: Line }) {
  const { clause, equation } = block.reference;
  return (
    <div className="line-reference">
      <span className="line-number">{block.number}</span>
      {(clause || equation) && (
        <span className="line-clause">
          <span>{clause}</span> {equation && <span className="text-zinc-7">{equation}</span>}
        </span>
      )}
    </div>
  );
}

function LineResult({ block }: { block: Line }) {
  const { result, also, verdict } = block;
  if (!result && !verdict) return null;
  const bad = verdict !== null && verdict !== 'OK';
  return (
    <div className="line-result">
      {also && (
        <span className="line-also">
          {also.value} {also.unit} ={' '}
        </span>
      )}
      <span className={classNames('line-value', bad && 'text-oxide')}>
        {verdict && <span className="line-verdict">{verdict} </span>}
        {result?.value}
      </span>
      {result?.unit && <span className="line-unit"> {result.unit}</span>}
    </div>
  );
}

const toneWords: Record<Line['tone'], string | null> = {
  plain: null,
  note: 'Note',
  caution: 'Caution',
  'outside scope': 'Outside scope',
  failed: 'Failed',
};

function LineWords({ block }: { block: Line }) {
  const { sentence, given } = block;
  const tone = toneWords[block.tone];
  if (sentence.length === 0 && !given) return null;
  return (
    <div className={classNames('line-words', block.lineKind === 'lookup' && 'is-source')}>
      {tone && <strong className="line-tone">{tone}. </strong>}
      <Inlines runs={sentence} />
      {given && (
        <span className={classNames('line-source', sentence.length > 0 && 'is-after-words')}>
          <SourceRing letter={given.letter} confirmed={given.confirmed} />
          <span>
            {given.source}
            {given.confirmed ? ', confirmed' : ', '}
            {!given.confirmed && <strong className="text-oxide">not confirmed</strong>}
          </span>
        </span>
      )}
    </div>
  );
}
