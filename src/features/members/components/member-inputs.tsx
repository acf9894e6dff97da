import { fieldClass } from '#client/ui/field.tsx';
import { type DraftQuantity, notGiven } from '#shared/contracts/draft-quantity.ts';
import { type LengthName, lengthNames } from '#shared/contracts/members.ts';
import { ENDS } from '#shared/members/input.ts';
import { withStated, withText } from '../edit-draft.ts';
import { CbWords, lengthWords } from '../member-fields.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { ChartsPart } from './parts/charts-part.tsx';
import { MemberPartLinks } from './parts/member-part-links.tsx';
import { NetSectionPart } from './parts/net-section-part.tsx';
import { RestraintsPart } from './parts/restraints-part.tsx';
import { SpringsRows } from './parts/springs-rows.tsx';
import { StiffenersPart } from './parts/stiffeners-part.tsx';
import { QuantityRow } from './quantity-row.tsx';
import { SectionField } from './section-field.tsx';
import { SourceControl } from './source-control.tsx';
import { SteelFields } from './steel-fields.tsx';

/** What the member is and how it is held, in the left margin. */
export function MemberInputs({ units }: { units: 'us' | 'si' }) {
  const { draft } = useMemberForm();
  return (
    <>
      <section aria-labelledby="inputs-member">
        <h2 id="inputs-member" className="caps mb-1.5">
          Member {draft.mark}
        </h2>
        <LabelRow name="mark" label="Mark" />
        <LabelRow name="place" label="Where" />
        <SectionField units={units} />
        <SteelFields />
        <LengthRow name="length" units={units} />
      </section>
      <section aria-labelledby="inputs-restraints" className="mt-5">
        <h2 id="inputs-restraints" className="caps mb-1.5">
          Restraints
        </h2>
        <EndsRow />
        <SpringsRows units={units} />
        {lengthNames.slice(1).map((name) => (
          <LengthRow key={name} name={name} units={units} />
        ))}
        <CbRow />
      </section>
      <RestraintsPart units={units} />
      <ChartsPart />
      <NetSectionPart units={units} />
      <StiffenersPart units={units} />
      <MemberPartLinks />
    </>
  );
}

function LabelRow({ name, label }: { name: 'mark' | 'place'; label: string }) {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const problem = problemAt(name);
  return (
    <InputRow path={name} label={label} problem={problem}>
      {(control) => (
        <input
          {...control}
          value={draft[name]}
          readOnly={!editable}
          maxLength={name === 'mark' ? 40 : 120}
          autoComplete="off"
          onChange={(event) => edit({ ...draft, [name]: event.target.value }, name)}
          className={fieldClass(problem !== undefined)}
        />
      )}
    </InputRow>
  );
}

function LengthRow({ name, units }: { name: LengthName; units: 'us' | 'si' }) {
  const { draft, edit, derived } = useMemberForm();
  const unit = units === 'us' ? 'ft' : 'm';
  const follows = name !== 'length' && draft.restraints !== undefined;
  return (
    <QuantityRow
      path={name}
      words={lengthWords[name]}
      quantity={draft[name]}
      placeholder={follows ? (derived(name) ?? (name === 'Lb' ? 'by segment' : 'follows')) : unit}
      onChange={(quantity) =>
        edit(withStated(draft, name, follows ? afresh(draft[name], quantity) : quantity), name)
      }
    />
  );
}

/** A length that follows from the points has no source; one put in its place has a new one. */
const afresh = (was: DraftQuantity, quantity: DraftQuantity): DraftQuantity =>
  was.text.trim() === '' || quantity.text.trim() === ''
    ? { ...notGiven, text: quantity.text }
    : quantity;

function CbRow() {
  const { draft, edit } = useMemberForm();
  return (
    <QuantityRow
      path="Cb"
      words={CbWords}
      quantity={draft.Cb}
      placeholder="1.0"
      onChange={(quantity) => edit(withStated(draft, 'Cb', quantity), 'Cb')}
    />
  );
}

const endWords: Readonly<Record<(typeof ENDS)[number], string>> = {
  held: 'both held',
  free: 'an end free',
  sway: 'may sway',
  springs: 'in springs',
};

export function EndsRow() {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const { ends } = draft;
  const problem = problemAt('ends');
  const known = ENDS.some((word) => word === ends.text);
  return (
    <InputRow
      path="ends"
      label="Ends"
      problem={problem}
      source={
        <SourceControl
          what="the ends"
          stated={ends}
          onChange={(stated) =>
            edit(withStated(draft, 'ends', { ...ends, ...stated }), 'ends/source')
          }
        />
      }
    >
      {(control) => (
        <select
          {...control}
          value={ends.text}
          disabled={!editable}
          title="Held: in both planes and against twist"
          onChange={(event) =>
            edit(withStated(draft, 'ends', withText(ends, event.target.value)), 'ends')
          }
          className={fieldClass(problem !== undefined)}
        >
          {!known && <option value={ends.text}>{ends.text || 'choose'}</option>}
          {ENDS.map((word) => (
            <option key={word} value={word}>
              {endWords[word]}
            </option>
          ))}
        </select>
      )}
    </InputRow>
  );
}
