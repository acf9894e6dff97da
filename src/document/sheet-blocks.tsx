import type { BlockOf } from '#shared/report/tree.ts';
import { useDocument } from './document-context.ts';
import { sectionName } from './section-name.ts';

/** The title block of a member's sheet. */
export function SheetHeadBlock({ block }: { block: BlockOf<'sheetHead'> }) {
  const { titleFields } = useDocument();
  const name = [block.mark || 'without a mark', sectionName(block.section), block.material];
  return (
    <header className="sheet-head">
      <div>
        <span className="field-label">Member sheet</span>
        <h1>{name.filter(Boolean).join(' · ')}</h1>
      </div>
      {titleFields.map(({ label, value }) => (
        <div key={label} className="sheet-head-field">
          <span className="field-label">{label}</span>
          <span className="field-value">{value}</span>
        </div>
      ))}
    </header>
  );
}

/** Word and ratio, the terms against the limit, and what governs. */
export function VerdictBlock({ block }: { block: BlockOf<'verdict'> }) {
  const { follow } = useDocument();
  const { address } = block;
  const bad = block.verdict !== 'OK';
  const figure = (
    <>
      <span className="verdict-word">{block.verdict}</span>
      {block.ratioText && <span className="verdict-ratio">{block.ratioText}</span>}
    </>
  );
  return (
    <div
      className={block.ratioText === null ? 'sheet-verdict has-reason' : 'sheet-verdict'}
      data-verdict={block.verdict}
    >
      <p className={bad ? 'verdict-figure text-oxide' : 'verdict-figure'}>
        {address && follow ? (
          <button
            type="button"
            className="verdict-follow"
            aria-label={`${block.verdict} ${block.ratioText ?? ''}, to its line`}
            onClick={() => follow(address, undefined)}
          >
            {figure}
          </button>
        ) : (
          figure
        )}
      </p>
      {block.ratioText !== null && <TermBar block={block} />}
      <p className="verdict-governs">
        {block.ratioText === null ? block.governs : `governs ${block.governs}`}
        {block.combination && <span>combination {block.combination}</span>}
      </p>
    </div>
  );
}

const termInks = ['ink', 'oxide', 'oxide3', 'zinc5'] as const;

function TermBar({ block }: { block: BlockOf<'verdict'> }) {
  const { terms, limit } = block;
  if (terms.length === 0) return <div className="term-bar" />;
  const total = terms.reduce((sum, { value }) => sum + value, 0);
  const scale = 100 / Math.max(1.0, total * 1.01);
  let at = 0;
  const bars = terms.map((term, index) => {
    const x = at;
    at += term.value * scale;
    return { ...term, x, width: term.value * scale, ink: termInks[index % termInks.length] };
  });
  return (
    <div className="term-bar">
      <svg viewBox="0 0 100 12" preserveAspectRatio="none" aria-hidden="true">
        <rect x="0" y="2" width={scale} height="8" fill="var(--ink-zinc1)" />
        {bars.map(({ label, x, width, ink }) => (
          <rect key={label} x={x} y="2" width={width} height="8" fill={`var(--ink-${ink})`} />
        ))}
        <rect x={scale - 0.45} y="0" width="0.45" height="12" fill="var(--ink-ink)" />
      </svg>
      <ul className="term-key">
        {bars.map(({ label, text, ink }) => (
          <li key={label}>
            <svg viewBox="0 0 8 8" aria-hidden="true">
              <rect width="8" height="8" fill={`var(--ink-${ink})`} />
            </svg>
            {label} {text}
          </li>
        ))}
        <li className="term-limit">limit {limit}</li>
      </ul>
    </div>
  );
}
