import { SelectField } from '#client/ui/text-field.tsx';
import { type LengthName, lengthNames, type MemberDraft } from '#shared/contracts/members.ts';
import { type ChangeKind, changeKinds, type SeveralChange } from '../bulk-change.ts';
import { changeWords } from '../bulk-words.ts';
import { withStated } from '../edit-draft.ts';
import { CbWords, lengthWords } from '../member-fields.ts';
import { BulkPoints } from './bulk-points.tsx';
import { BulkState } from './bulk-state.tsx';
import { SenseRow } from './combination-inputs.tsx';
import { MemberFormContext } from './member-form-context.ts';
import { EndsRow } from './member-inputs.tsx';
import { SpringsRows } from './parts/springs-rows.tsx';
import { QuantityRow } from './quantity-row.tsx';
import { SectionField } from './section-field.tsx';
import { SteelFields } from './steel-fields.tsx';

interface Source {
  readonly id: string;
  readonly mark: string;
}

/** What is changed and to what, by the fields of a member's own form. */
export function BulkChangeForm(props: {
  calculationId: string;
  units: 'us' | 'si';
  /** All members of the calculation, to copy points from. */
  members: readonly Source[];
  change: SeveralChange;
  problemAt: (path: string) => string | undefined;
  onChange: (change: SeveralChange) => void;
}) {
  const { units, change, onChange } = props;
  const { kind, pattern } = change;
  const form = {
    ...{ draft: pattern, editable: true, derived: () => null, problemAt: props.problemAt },
    edit: (next: MemberDraft) => onChange({ ...change, pattern: next }),
  };
  return (
    <MemberFormContext value={form}>
      <SelectField<ChangeKind>
        label="What changes"
        value={kind}
        options={changeKinds.map((value) => ({ value, text: changeWords[value] }))}
        onValue={(next) => onChange({ ...change, kind: next })}
      />
      <div className="mt-4">
        {kind === 'section' && <SectionField units={units} />}
        {kind === 'steel' && <SteelFields />}
        {kind === 'ends' && (
          <>
            <EndsRow />
            <SpringsRows units={units} />
          </>
        )}
        {isLength(kind) && (
          <QuantityRow
            path={kind}
            words={lengthWords[kind]}
            quantity={pattern[kind]}
            placeholder={units === 'us' ? 'ft' : 'm'}
            onChange={(quantity) => form.edit(withStated(pattern, kind, quantity))}
          />
        )}
        {kind === 'Cb' && (
          <QuantityRow
            path="Cb"
            words={CbWords}
            quantity={pattern.Cb}
            placeholder="1.0"
            onChange={(quantity) => form.edit(withStated(pattern, 'Cb', quantity))}
          />
        )}
        {kind === 'sense' && <SenseRow />}
        {kind === 'points' && (
          <BulkPoints
            calculationId={props.calculationId}
            members={props.members}
            onFrom={(pointsOf) => onChange({ ...change, pointsOf })}
          />
        )}
        {kind === 'state' && (
          <BulkState state={change.state} onChange={(state) => onChange({ ...change, state })} />
        )}
      </div>
    </MemberFormContext>
  );
}

const isLength = (kind: ChangeKind): kind is LengthName =>
  (lengthNames as readonly string[]).includes(kind);
