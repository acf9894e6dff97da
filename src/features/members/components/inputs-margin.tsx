import type { ReactNode } from 'react';
import { when } from '#client/lib/clock.ts';
import { count } from '#client/lib/count.ts';
import { Note } from '#client/ui/note.tsx';
import type { MemberRecord } from '#shared/calc/record.ts';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { CombinationInputs } from './combination-inputs.tsx';
import { CombinationList } from './combination-list.tsx';
import { useMemberForm } from './member-form-context.ts';
import { MemberInputs } from './member-inputs.tsx';

/** All inputs of the member and of the combination that is shown. */
export function InputsMargin(props: {
  basis: BasisDraft;
  record: MemberRecord | null;
  combination: string | undefined;
  note: ReactNode;
  restoredFrom: string | null;
  onShow: (id: string) => void;
  onAdd: () => void;
  onOpenTable: () => void;
}) {
  const { basis, record, combination } = props;
  const { draft, editable } = useMemberForm();
  const row = draft.combinations.find(({ id }) => id === combination) ?? draft.combinations[0];
  const open = record?.unconfirmed ?? 0;
  return (
    <aside aria-label="Inputs" data-screen-only className="member-margin px-4 py-5">
      {props.restoredFrom && (
        <div className="mb-4">
          <Note tone="asks">
            Input of {when(props.restoredFrom)} that was not saved yet was brought back. Undo takes
            it away again.
          </Note>
        </div>
      )}
      {!editable && (
        <div className="mb-4">
          <Note>You may read this member. Its engineer changes it.</Note>
        </div>
      )}
      <MemberInputs units={basis.units} />
      {open > 0 && (
        <div className="mt-3">
          <Note tone="asks">
            {count(open, 'input')} not confirmed. They print so and hold the issue until a drawing,
            a file or a person confirms them.
          </Note>
        </div>
      )}
      <div className="mt-5">
        <CombinationList
          rows={draft.combinations}
          record={record}
          shown={row?.id}
          editable={editable}
          onShow={props.onShow}
          onAdd={props.onAdd}
          onOpenTable={props.onOpenTable}
        />
      </div>
      {row && (
        <section aria-labelledby="inputs-forces" className="mt-5">
          <h2 id="inputs-forces" className="caps mb-1.5">
            Combination <span className="normal-case">{row.name}</span>
          </h2>
          <CombinationInputs
            row={row}
            units={basis.units}
            withLargest={basis.analysis.secondOrder === 'from-analysis'}
            withSway={basis.analysis.sway === 'B2'}
          />
        </section>
      )}
      <div className="mt-5">{props.note}</div>
    </aside>
  );
}
