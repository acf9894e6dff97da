import { sectionName } from '#client/document/section-name.ts';
import { Button } from '#client/ui/button.tsx';
import { fieldClass } from '#client/ui/field.tsx';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import {
  actionNames,
  actionOf,
  type DraftCombination,
  type MemberDraft,
} from '#shared/contracts/members.ts';
import { analysedAgain, sectionLeft, withAction, withCombination } from '../edit-draft.ts';
import { actionWords } from '../member-fields.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { CombinationParts } from './parts/combination-parts.tsx';
import { QuantityRow } from './quantity-row.tsx';

/** The forces of the combination whose sheet is shown. */
export function CombinationInputs(props: {
  row: DraftCombination;
  units: 'us' | 'si';
  /** Largest moments are asked for only where an analysis gives them. */
  withLargest: boolean;
  /** The basis takes sway by B2. */
  withSway: boolean;
}) {
  const { row, units } = props;
  const { draft, edit, editable, problemAt } = useMemberForm();
  const at = `combinations[${draft.combinations.indexOf(row)}]`;
  const shown = actionNames.filter(
    (action) =>
      !action.startsWith('V') &&
      (props.withLargest || !action.endsWith('Max') || actionOf(row, action).text !== ''),
  );
  const nameProblem = problemAt(`${at}.name`) ?? problemAt(`${at}.design`);
  return (
    <>
      <InputRow path={`${at}.name`} label="Name" problem={nameProblem}>
        {(control) => (
          <input
            {...control}
            value={row.name}
            readOnly={!editable}
            maxLength={120}
            autoComplete="off"
            onChange={(event) =>
              edit(
                withCombination(draft, row.id, (was) => ({ ...was, name: event.target.value })),
                `${row.id}/name`,
              )
            }
            className={fieldClass(nameProblem !== undefined)}
          />
        )}
      </InputRow>
      {shown.map((action) => (
        <QuantityRow
          key={action}
          path={`${at}.${action}`}
          words={actionWords[action]}
          quantity={actionOf(row, action)}
          placeholder={placeholders[units][action === 'P' ? 'force' : 'moment']}
          onChange={(quantity) =>
            edit(withAction(draft, row.id, action, quantity), `${row.id}/${action}`)
          }
        />
      ))}
      <SenseRow />
      <SectionLeft row={row} />
      <CombinationParts row={row} units={units} withSway={props.withSway} />
    </>
  );
}

/** Forces of an analysis with another section count as not confirmed until it is run again. */
function SectionLeft({ row }: { row: DraftCombination }) {
  const { draft, edit, editable } = useMemberForm();
  const left = sectionLeft(draft, row);
  if (!left) return null;
  const now = sectionName(sectionTextOf(draft));
  return (
    <div role="status" className="mt-2 border-l-2 border-oxide pl-3 text-small">
      <p>
        These forces were analysed with {sectionName(left)}, the member is {now} now. They are not
        confirmed until the analysis is run again.
      </p>
      {editable && (
        <Button
          size="small"
          className="mt-1.5"
          onClick={() => edit(analysedAgain(draft, row.id), `${row.id}/analysedWith`)}
        >
          Analysed again with {now}
        </Button>
      )}
    </div>
  );
}

const placeholders = {
  us: { force: 'kip', moment: 'kip ft' },
  si: { force: 'kN', moment: 'kN m' },
} as const;

/** What equal signs of the end moments mean. */
export function SenseRow() {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const problem = problemAt('endMomentSign');
  return (
    <InputRow path="endMomentSign" label="Equal signs" problem={problem}>
      {(control) => (
        <select
          {...control}
          value={draft.endMomentSign}
          disabled={!editable}
          title="What equal signs of the two end moments mean, for all combinations of the member"
          onChange={(event) =>
            edit(
              { ...draft, endMomentSign: event.target.value as MemberDraft['endMomentSign'] },
              'endMomentSign',
            )
          }
          className={fieldClass(problem !== undefined)}
        >
          <option value="">choose</option>
          <option value="bending">single curvature</option>
          <option value="joint">reverse curvature</option>
        </select>
      )}
    </InputRow>
  );
}
