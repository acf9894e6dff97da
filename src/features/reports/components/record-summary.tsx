import { useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Blocks } from '#client/document/blocks.tsx';
import { DocumentContext, plainDocument } from '#client/document/document-context.ts';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { cautionsBlock } from '#shared/report/cautions.ts';
import { completenessBlocks } from '#shared/report/completeness-block.ts';
import { resultsBlock } from '#shared/report/results-block.ts';
import type { Block } from '#shared/report/tree.ts';
import { unconfirmedBlock } from '#shared/report/unconfirmed-block.ts';

const heading = (text: string): Block => ({ kind: 'heading', level: 1, text });

/** What the report says of a calculation as a whole; every value leads to its line. */
export function RecordSummary(props: { calculationId: string; record: CalculationRecord }) {
  const { calculationId, record } = props;
  const navigate = useNavigate();
  const blocks = useMemo(
    () => [
      heading('Results'),
      resultsBlock(record),
      heading('Inputs not confirmed'),
      unconfirmedBlock(record),
      heading('Completeness'),
      ...completenessBlocks(record),
      heading('Cautions'),
      cautionsBlock(),
    ],
    [record],
  );
  const context = useMemo<DocumentContext>(
    () => ({
      ...plainDocument,
      follow: (address, member) => {
        if (member) void navigate(paths.member(calculationId, member, { line: address }));
      },
    }),
    [calculationId, navigate],
  );
  return (
    <DocumentContext value={context}>
      <Blocks blocks={blocks} />
      <dl className="mx-6 mt-8 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 border-t-2 border-ink pt-3 text-small">
        {hashes(record).map(([label, value]) => (
          <div key={label} className="contents">
            <dt className="text-zinc-7">{label}</dt>
            <dd className="font-mono break-all">{value}</dd>
          </div>
        ))}
      </dl>
    </DocumentContext>
  );
}

const hashes = (record: CalculationRecord): readonly (readonly [string, string])[] => [
  ['Engine', `${record.program.name} ${record.program.engine}`],
  ['Results, SHA-256', record.resultHash ?? 'none'],
  ['With sources and states', record.snapshotHash ?? 'none'],
];
