import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Shell } from '#client/app/shell.tsx';
import {
  calculationCrumbs,
  calculationTabs,
} from '#client/features/calculations/calculation-tabs.ts';
import { RevisionTag } from '#client/features/calculations/components/revision-tag.tsx';
import { calculationQuery } from '#client/features/calculations/queries.ts';
import { DownloadButton } from '#client/features/reports/components/download-button.tsx';
import { RefusedRecord } from '#client/features/reports/components/refused-record.tsx';
import { ReportDocument } from '#client/features/reports/components/report-document.tsx';
import { reportQuery } from '#client/features/reports/queries.ts';
import { Fetched, isAbsent } from '#client/ui/page-state.tsx';
import { Paper, PaperHead } from '#client/ui/paper.tsx';
import { Waiting } from '#client/ui/state-panels.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { NotFoundPage } from './not-found-page.tsx';

export function Component() {
  const { calculationId = '' } = useParams();
  const query = useQuery(calculationQuery(calculationId));
  if (isAbsent(query)) return <NotFoundPage what="calculation" />;
  return (
    <Shell
      title={query.data ? `Report, ${query.data.number}` : 'Report'}
      crumbs={calculationCrumbs(query.data)}
      tabs={calculationTabs(calculationId)}
      status={query.data && <RevisionTag calculation={query.data} />}
    >
      <Paper className="@container/sheet max-w-[980px] px-4 pt-9 pb-12">
        <Fetched query={query} what="calculation">
          {(calculation) => <ReportPaper calculation={calculation} />}
        </Fetched>
      </Paper>
    </Shell>
  );
}

function ReportPaper({ calculation }: { calculation: Calculation }) {
  const { id, number } = calculation;
  const report = useQuery(reportQuery(id));
  return (
    <>
      <div className="px-6">
        <PaperHead
          title={`Report of ${number}`}
          sub={`${calculation.title} · preliminary, not issued`}
          actions={
            <>
              <DownloadButton file="downloadInput" calculationId={id} name={`${number}-INPUT.json`}>
                INPUT.json
              </DownloadButton>
              <DownloadButton
                file="downloadReport"
                calculationId={id}
                name={`${number}.pdf`}
                rank="main"
              >
                Report as PDF
              </DownloadButton>
            </>
          }
        />
      </div>
      {report.data && <ReportDocument calculationId={id} report={report.data} />}
      {report.error && (
        <RefusedRecord
          error={report.error}
          calculation={calculation}
          onRetry={() => void report.refetch()}
        />
      )}
      {report.isPending && (
        <div className="px-6">
          <Waiting what="report" />
        </div>
      )}
    </>
  );
}
