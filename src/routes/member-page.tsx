import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Shell } from '#client/app/shell.tsx';
import { basisLine } from '#client/features/calculations/basis-words.ts';
import {
  calculationCrumbs,
  calculationTabs,
} from '#client/features/calculations/calculation-tabs.ts';
import { RevisionTag } from '#client/features/calculations/components/revision-tag.tsx';
import { calculationQuery } from '#client/features/calculations/queries.ts';
import { MemberEditor } from '#client/features/members/components/member-editor.tsx';
import { Neighbours } from '#client/features/members/components/neighbours.tsx';
import { memberQuery } from '#client/features/members/queries.ts';
import { useMemberDraft } from '#client/features/members/use-member-draft.ts';
import { initials } from '#client/lib/initials.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { Note } from '#client/ui/note.tsx';
import { isAbsent } from '#client/ui/page-state.tsx';
import { SaveStatus } from '#client/ui/save-status.tsx';
import { Failure, Waiting } from '#client/ui/state-panels.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import type { Member } from '#shared/contracts/members.ts';
import { NotFoundPage } from './not-found-page.tsx';

export function Component() {
  const { calculationId = '', memberId = '' } = useParams();
  const calculation = useQuery(calculationQuery(calculationId));
  const member = useQuery(memberQuery(calculationId, memberId));
  if (isAbsent(calculation)) return <NotFoundPage what="calculation" />;
  if (isAbsent(member)) return <NotFoundPage what="member" />;
  if (calculation.data && member.data) {
    return <MemberPage key={memberId} calculation={calculation.data} member={member.data} />;
  }
  const error = calculation.error ?? member.error;
  const retry = () => void Promise.all([calculation.refetch(), member.refetch()]);
  return (
    <Shell
      title="Member"
      crumbs={calculationCrumbs(calculation.data)}
      tabs={calculationTabs(calculationId, true)}
    >
      {error ? (
        <Failure title="The member could not be fetched" onRetry={retry}>
          {reasonOf(error)}
        </Failure>
      ) : (
        <Waiting what="the member" />
      )}
    </Shell>
  );
}

function MemberPage({ calculation, member }: { calculation: Calculation; member: Member }) {
  const editable = calculation.can.edit;
  const draft = useMemberDraft(calculation.id, member, editable);
  const rows = calculation.memberRows;
  const position = Math.max(1, rows.findIndex(({ id }) => id === member.id) + 1);
  const mark = draft.value.mark || 'Member';
  return (
    <Shell
      title={`${mark}, ${calculation.number}`}
      crumbs={[...calculationCrumbs(calculation), { text: mark }]}
      tabs={calculationTabs(calculation.id, true)}
      layout="bare"
      status={
        <>
          {editable && <SaveStatus state={draft.saveState} onSave={draft.saveNow} />}
          <RevisionTag calculation={calculation} />
        </>
      }
    >
      <MemberEditor
        memberId={member.id}
        draft={draft}
        basis={calculation.basis}
        editable={editable}
        position={position}
        titleFields={[
          { label: 'Calculation', value: calculation.number },
          { label: 'Revision', value: `${calculation.revision}, ${calculation.state}` },
          { label: 'By', value: initials(member.changedBy) },
          { label: 'Sheet', value: `${position} of ${rows.length}` },
        ]}
        basisNote={
          <Note>
            {basisLine(calculation.basis)}.{' '}
            <Link to={paths.basis(calculation.id)} className="link text-ink">
              Basis of design
            </Link>
          </Note>
        }
        neighbours={<Neighbours calculationId={calculation.id} rows={rows} memberId={member.id} />}
      />
    </Shell>
  );
}
