import { classNames } from '#client/ui/class-names.ts';
import type { BlockOf, TableCell } from '#shared/report/tree.ts';
import { Inlines } from './inlines.tsx';

export function HeadingBlock({ block }: { block: BlockOf<'heading'> }) {
  // The third level begins a part of a sheet, whose own heading is the first.
  const Tag = block.level === 2 ? 'h3' : 'h2';
  return (
    <Tag
      className={`document-heading level-${block.level}`}
      {...(block.id ? { id: block.id } : {})}
    >
      {block.text}
    </Tag>
  );
}

export const ParagraphBlock = ({ block }: { block: BlockOf<'paragraph'> }) => (
  <p className="document-paragraph">
    <Inlines runs={block.content} />
  </p>
);

export function ListBlock({ block }: { block: BlockOf<'list'> }) {
  const Tag = block.ordered ? 'ol' : 'ul';
  return (
    <Tag className="document-list">
      {block.items.map((runs, index) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: items of a finished text
        <li key={index}>
          <Inlines runs={runs} />
        </li>
      ))}
    </Tag>
  );
}

const cellClass = ({ align, tone = 'plain' }: TableCell) =>
  classNames(align === 'right' && 'text-right', `cell-${tone}`);

export function TableBlock({ block }: { block: BlockOf<'table'> }) {
  const whole = block.widths.reduce((sum, width) => sum + width, 0);
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a wide table scrolls, by keyboard too
    <section className="document-table" tabIndex={0} aria-label={block.caption}>
      <table>
        <caption>{block.caption}</caption>
        <colgroup>
          {block.widths.map((width, index) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: columns in their order
            <col key={index} style={{ width: `${(100 * width) / whole}%` }} />
          ))}
        </colgroup>
        <thead>
          <tr>
            {block.head.map((cell, index) => (
              // biome-ignore lint/suspicious/noArrayIndexKey: columns in their order
              <th key={index} scope="col" className={cellClass(cell)}>
                <Inlines runs={cell.content} />
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {block.rows.map((row, index) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: rows in their order
            <tr key={index}>
              {row.map((cell, column) => (
                // biome-ignore lint/suspicious/noArrayIndexKey: columns in their order
                <td key={column} className={cellClass(cell)}>
                  <Inlines runs={cell.content} inTabOrder />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

export function CoverBlock({ block }: { block: BlockOf<'cover'> }) {
  return (
    <header className="document-cover">
      <p className="cover-project">{block.project}</p>
      <h1>
        {block.number && <span className="cover-number">{block.number} </span>}
        {block.title}
      </h1>
      <dl>
        {block.fields.map(({ label, value, tone }) => (
          <div key={label}>
            <dt>{label}</dt>
            <dd className={tone === 'over' ? 'text-oxide' : undefined}>{value}</dd>
          </div>
        ))}
      </dl>
      {block.notices.map((notice) => (
        <p key={notice} className="cover-notice">
          {notice}
        </p>
      ))}
      {block.cautions.map((caution) => (
        <p key={caution} className="cover-caution">
          {caution}
        </p>
      ))}
    </header>
  );
}

export function CautionsBlock({ block }: { block: BlockOf<'cautions'> }) {
  return (
    <section className="document-cautions" aria-label="Cautions">
      <ul>
        {block.items.map((item) => (
          <li key={item}>{item}</li>
        ))}
      </ul>
    </section>
  );
}

export const PageBreakBlock = () => <hr className="document-page-break" />;
