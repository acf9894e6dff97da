import { useMemo } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Blocks } from '#client/document/blocks.tsx';
import { DocumentContext, plainDocument } from '#client/document/document-context.ts';
import type { AnswerOf } from '#shared/contracts/contract.ts';
import type { reports } from '#shared/contracts/reports.ts';
import { partReport } from '../part-report.ts';
import { ReportSheetFold } from './report-sheet-fold.tsx';

/** The report as its PDF has it, from the same tree; every value leads to its line. */
export function ReportDocument(props: {
  calculationId: string;
  report: AnswerOf<typeof reports.showReport>;
}) {
  const { calculationId, report } = props;
  const navigate = useNavigate();
  const { front, sheets } = useMemo(() => partReport(report.tree.blocks), [report]);
  const context = useMemo<DocumentContext>(
    () => ({
      ...plainDocument,
      follow: (address, member) => {
        if (member) void navigate(paths.member(calculationId, member, { line: address }));
      },
    }),
    [calculationId, navigate],
  );
  const hashes = [
    ['Results, SHA-256', report.resultHash],
    ['With sources and states', report.snapshotHash],
  ] as const;
  return (
    <DocumentContext value={context}>
      <Blocks blocks={front} />
      <h2 className="document-heading level-1">Member sheets</h2>
      {sheets.map((sheet) => (
        <ReportSheetFold key={sheet.head.member} sheet={sheet} context={context} />
      ))}
      <dl className="mx-6 mt-8 grid grid-cols-[auto_minmax(0,1fr)] gap-x-4 gap-y-1 border-t-2 border-ink pt-3 text-small">
        {hashes.map(([label, value]) => (
          <div key={label} className="contents">
            <dt className="text-zinc-7">{label}</dt>
            <dd className="font-mono break-all">{value}</dd>
          </div>
        ))}
      </dl>
    </DocumentContext>
  );
}
