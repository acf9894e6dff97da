import { useEffect, useMemo, useRef, useState } from 'react';
import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { Button } from '#client/ui/button.tsx';
import { Empty, Failure } from '#client/ui/state-panels.tsx';
import type { MemberRecord } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import type { ProblemPlace } from '#shared/contracts/problems.ts';
import { findShape, normalDesignation } from '#shared/sections/table.ts';
import type { FindOrder } from '../background-work.ts';
import { sectionLeft } from '../edit-draft.ts';
import { type FinderCriteria, readLimits } from '../finder-criteria.ts';
import { finderRows } from '../finder-rows.ts';
import { withOtherSection } from '../other-section.ts';
import { useFinder } from '../use-finder.ts';
import { FinderForces } from './finder-forces.tsx';
import { FinderForm } from './finder-form.tsx';
import { FinderProgress } from './finder-progress.tsx';
import { FinderTable } from './finder-table.tsx';
import { useMemberForm } from './member-form-context.ts';

/** Sections of the tables are chosen by hand here; where they come from is the search itself. */
const chosen = { source: { kind: 'typed', note: 'Section finder' }, confirmed: false } as const;

/** The lightest sections with which the member satisfies every check, to be taken by one key. */
export function FinderPaper(props: {
  memberId: string;
  basis: BasisDraft;
  /** The run of the present inputs, or of the last valid ones. */
  record: MemberRecord | null;
  problems: readonly ProblemPlace[];
  criteria: FinderCriteria;
  onCriteria: (criteria: FinderCriteria) => void;
  onShowSheet: () => void;
}) {
  const { memberId, basis, record, problems, criteria } = props;
  const { draft, edit, editable } = useMemberForm();
  const { units } = basis;
  const { limits, problems: limitProblems } = useMemo(
    () => readLimits(criteria.limits),
    [criteria],
  );
  const others = problems.filter(({ path }) => !/^(section|material)\b/.test(path));
  const hindered = others.length > 0 || Object.keys(limitProblems).length > 0;
  const order: FindOrder | null = hindered
    ? null
    : {
        ...{ task: 'find', basis, id: memberId, family: criteria.family, limits },
        // What has no part in a search is left out, so that a change of it starts none.
        draft: { ...withOtherSection(draft, { text: '', ...chosen }), place: '' },
      };
  const finder = useFinder(order);
  const { result: search } = finder;
  const present =
    findShape(sectionTextOf(draft))?.designation ?? normalDesignation(sectionTextOf(draft));
  const isRun = record !== null && problems.length === 0 && record.section === present;
  const rows = finderRows(search, {
    designation: present,
    summary: isRun ? record.summary : null,
  });
  const [taken, setTaken] = useState<{ from: string; to: string } | null>(null);
  const paper = useRef<HTMLElement>(null);
  useEffect(() => paper.current?.querySelector('select')?.focus(), []);
  const table = useRef<HTMLDivElement>(null);
  const take = (designation: string) => {
    if (designation === present) return;
    setTaken({ from: sectionTextOf(draft), to: designation });
    edit(withOtherSection(draft, { text: designation, ...chosen }), 'section/found');
  };
  const wasTaken = taken?.to === present ? taken : null;
  const left = draft.combinations.filter((row) => sectionLeft(draft, row) !== null).length;
  return (
    <section
      ref={paper}
      aria-label="Section finder"
      className="mx-auto max-w-[1080px] bg-paper px-7 pt-6 pb-9 shadow-sheet"
    >
      <h1 className="font-serif text-title font-semibold">
        Lightest sections for {draft.mark || 'the member'}
      </h1>
      <p className="mb-3 text-zinc-7">
        Those of a kind with which every check is satisfied under{' '}
        {draft.combinations.length === 1
          ? 'its combination'
          : `each of its ${count(draft.combinations.length, 'combination')}`}
        , by weight. Each was run as a whole, as the sheet is.
      </p>
      <FinderForm
        criteria={criteria}
        units={units}
        problems={limitProblems}
        onChange={props.onCriteria}
      />
      <FinderForces draft={draft} />
      {wasTaken && (
        <div role="status" className="mt-3 border-l-3 border-oxide bg-oxide-2 px-4 py-2.5">
          <p className="font-semibold">
            {draft.mark} is {sectionName(wasTaken.to)} now
            {wasTaken.from && `, in place of ${sectionName(wasTaken.from)}`}.
          </p>
          <p className="text-small">
            {left > 0
              ? `The forces of ${count(left, 'combination')} are still those of the section they were analysed with. They count as not confirmed until the analysis is run again. `
              : ''}
            The section itself is not confirmed either. Undo takes it back.
          </p>
          <Button size="small" className="mt-1.5" onClick={props.onShowSheet}>
            Show its sheet
          </Button>
        </div>
      )}
      {hindered ? (
        <div className="mt-4">
          <Empty>
            The search starts by itself once what is wrong with{' '}
            {others.length > 0 ? 'the inputs' : 'the limits'} is corrected.
          </Empty>
        </div>
      ) : finder.state === 'failed' ? (
        <div className="mt-4">
          <Failure title="The search broke off" onRetry={finder.again}>
            Nothing was changed.
          </Failure>
        </div>
      ) : (
        <>
          <FinderProgress
            finder={finder}
            family={criteria.family}
            material={draft.ownSteel?.name ?? draft.material}
            onLeave={() => table.current?.querySelector('button')?.focus()}
          />
          {rows.length > 0 && (
            <div ref={table}>
              <FinderTable rows={rows} units={units} onTake={editable && search ? take : null} />
            </div>
          )}
        </>
      )}
    </section>
  );
}
