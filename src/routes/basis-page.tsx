import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Shell } from '#client/app/shell.tsx';
import {
  calculationCrumbs,
  calculationTabs,
} from '#client/features/calculations/calculation-tabs.ts';
import { BasisForm, useBasisDraft } from '#client/features/calculations/components/basis-form.tsx';
import { RevisionTag } from '#client/features/calculations/components/revision-tag.tsx';
import { calculationQuery } from '#client/features/calculations/queries.ts';
import { Note } from '#client/ui/note.tsx';
import { Fetched, isAbsent } from '#client/ui/page-state.tsx';
import { Paper, PaperHead } from '#client/ui/paper.tsx';
import { SaveStatus } from '#client/ui/save-status.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { NotFoundPage } from './not-found-page.tsx';

export function Component() {
  const { calculationId = '' } = useParams();
  const query = useQuery(calculationQuery(calculationId));
  if (isAbsent(query)) return <NotFoundPage what="calculation" />;
  if (query.data) return <BasisPage key={calculationId} calculation={query.data} />;
  return (
    <Shell
      title="Basis of design"
      crumbs={calculationCrumbs(undefined)}
      tabs={calculationTabs(calculationId)}
    >
      <Paper className="px-10 pt-9 pb-14">
        <Fetched query={query} what="calculation">
          {() => null}
        </Fetched>
      </Paper>
    </Shell>
  );
}

function BasisPage({ calculation }: { calculation: Calculation }) {
  const draft = useBasisDraft(calculation);
  return (
    <Shell
      title={`Basis, ${calculation.number}`}
      crumbs={calculationCrumbs(calculation)}
      tabs={calculationTabs(calculation.id)}
      status={
        <>
          {calculation.can.edit && <SaveStatus state={draft.saveState} onSave={draft.saveNow} />}
          <RevisionTag calculation={calculation} />
        </>
      }
    >
      <Paper className="px-10 pt-9 pb-14">
        <PaperHead title="Basis of design" sub={`${calculation.number} ${calculation.title}`} />
        {!calculation.can.edit && (
          <div className="mt-4">
            <Note>Your role here is to read: {calculation.roles.join(', ')}.</Note>
          </div>
        )}
        <BasisForm draft={draft} editable={calculation.can.edit} />
      </Paper>
    </Shell>
  );
}
