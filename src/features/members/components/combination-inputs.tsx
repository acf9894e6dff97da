import { fieldClass } from '#client/ui/field.tsx';
import { actionNames, type DraftCombination, type MemberDraft } from '#shared/contracts/members.ts';
import { withAction, withCombination } from '../edit-draft.ts';
import { actionWords } from '../member-fields.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { QuantityRow } from './quantity-row.tsx';

/** The forces of the combination whose sheet is shown. */
export function CombinationInputs(props: {
  row: DraftCombination;
  units: 'us' | 'si';
  /** Largest moments are asked for only where an analysis gives them. */
  withLargest: boolean;
}) {
  const { row, units } = props;
  const { draft, edit, editable, problemAt } = useMemberForm();
  const at = `combinations[${draft.combinations.indexOf(row)}]`;
  const shown = actionNames.filter(
    (action) => props.withLargest || !action.endsWith('Max') || row[action].text !== '',
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
          quantity={row[action]}
          placeholder={placeholders[units][action === 'P' ? 'force' : 'moment']}
          onChange={(quantity) =>
            edit(withAction(draft, row.id, action, quantity), `${row.id}/${action}`)
          }
        />
      ))}
      <SenseRow />
    </>
  );
}

const placeholders = {
  us: { force: 'kip', moment: 'kip ft' },
  si: { force: 'kN', moment: 'kN m' },
} as const;

function SenseRow() {
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
