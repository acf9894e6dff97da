import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Shell } from '#client/app/shell.tsx';
import { basisLine } from '#client/features/calculations/basis-words.ts';
import {
  calculationCrumbs,
  calculationTabs,
} from '#client/features/calculations/calculation-tabs.ts';
import { CalculationBand } from '#client/features/calculations/components/calculation-band.tsx';
import { RevisionTag } from '#client/features/calculations/components/revision-tag.tsx';
import { calculationQuery } from '#client/features/calculations/queries.ts';
import { DeletedMembers } from '#client/features/members/components/deleted-members.tsx';
import { MemberLedger } from '#client/features/members/components/member-ledger.tsx';
import { firstDraft, followingMark } from '#client/features/members/first-draft.ts';
import { useCreateMember } from '#client/features/members/mutations.ts';
import { DownloadButton } from '#client/features/reports/components/download-button.tsx';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import { Fetched, isAbsent } from '#client/ui/page-state.tsx';
import { Paper, PaperHead, PartHead } from '#client/ui/paper.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { NotFoundPage } from './not-found-page.tsx';

export function Component() {
  const { calculationId = '' } = useParams();
  const query = useQuery(calculationQuery(calculationId));
  if (isAbsent(query)) return <NotFoundPage what="calculation" />;
  return (
    <Shell
      title={query.data ? `${query.data.number} ${query.data.title}` : 'Calculation'}
      crumbs={calculationCrumbs(query.data)}
      tabs={calculationTabs(calculationId)}
      status={query.data && <RevisionTag calculation={query.data} />}
    >
      <Paper className="px-10 pt-9 pb-14">
        <Fetched query={query} what="calculation">
          {(calculation) => <MembersPaper calculation={calculation} />}
        </Fetched>
      </Paper>
    </Shell>
  );
}

function MembersPaper({ calculation }: { calculation: Calculation }) {
  const rows = calculation.memberRows;
  const add = calculation.can.edit && <AddMember calculation={calculation} />;
  return (
    <>
      <PaperHead
        title={`${calculation.number} ${calculation.title}`}
        sub={`${calculation.project.title} · ${basisLine(calculation.basis)}`}
        actions={<Downloads calculation={calculation} />}
      />
      <CalculationBand calculation={calculation} />
      {rows.length > 0 ? (
        <MemberLedger calculation={calculation} actions={add} />
      ) : (
        <>
          <PartHead title="Members" />
          <Empty action={add}>
            No members yet. A member has a mark, a section, lengths between restraints, and the
            forces of each combination.
          </Empty>
        </>
      )}
      {calculation.can.edit && <DeletedMembers calculation={calculation} />}
    </>
  );
}

function Downloads({ calculation }: { calculation: Calculation }) {
  const { id, number } = calculation;
  return (
    <>
      <DownloadButton file="downloadInput" calculationId={id} name={`${number}-INPUT.json`}>
        INPUT.json
      </DownloadButton>
      <DownloadButton file="downloadReport" calculationId={id} name={`${number}.pdf`} rank="main">
        Report as PDF
      </DownloadButton>
    </>
  );
}

function AddMember({ calculation }: { calculation: Calculation }) {
  const create = useCreateMember(calculation.id);
  const navigate = useNavigate();
  const announce = useAnnounce();
  const mark = followingMark(calculation.memberRows.map((row) => row.mark));
  return (
    <Button
      disabled={create.isPending}
      onClick={() =>
        create.mutate(firstDraft(mark), {
          onSuccess: ({ id }) => navigate(paths.member(calculation.id, id)),
          onError: (error) => announce(reasonOf(error)),
        })
      }
    >
      Add a member
    </Button>
  );
}
