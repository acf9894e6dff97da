import { useMemo, useState } from 'react';
import { Blocks } from '#client/document/blocks.tsx';
import { DocumentContext } from '#client/document/document-context.ts';
import type { ReportSheet } from '../part-report.ts';

/** One member's sheet, folded to its verdict until it is opened. */
export function ReportSheetFold(props: { sheet: ReportSheet; context: DocumentContext }) {
  const { head, verdict, blocks } = props.sheet;
  const [open, setOpen] = useState(false);
  const context = useMemo<DocumentContext>(
    () => ({
      ...props.context,
      follow: (address, member) => props.context.follow?.(address, member ?? head.member),
    }),
    [props.context, head.member],
  );
  const over = verdict !== undefined && verdict.verdict !== 'OK';
  return (
    <details
      className="mx-6 border-b border-zinc-2"
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary className="flex cursor-pointer items-baseline gap-3 py-2.5">
        <span className="font-semibold">{head.mark}</span>
        <span className="text-zinc-7">
          {head.section} · {head.material}
        </span>
        <span className={over ? 'ml-auto font-semibold text-oxide' : 'ml-auto font-semibold'}>
          {verdict ? [verdict.verdict, verdict.ratioText].filter(Boolean).join(' ') : ''}
        </span>
        <span aria-hidden="true" className="w-12 text-right text-small text-zinc-7">
          {open ? 'close' : 'open'}
        </span>
      </summary>
      {open && (
        <DocumentContext value={context}>
          <div className="-mx-6 pb-6">
            <Blocks blocks={blocks} />
          </div>
        </DocumentContext>
      )}
    </details>
  );
}
