import { Button } from '#client/ui/button.tsx';
import { ProblemText } from '#client/ui/field.tsx';
import type { DraftRestraint } from '#shared/contracts/draft-parts.ts';
import { lengthNames } from '#shared/contracts/members.ts';
import {
  restraintsOf,
  withHold,
  withNewRestraint,
  withOrder,
  withoutRestraint,
  withoutRestraints,
  withRestraint,
} from '../../edit-restraints.ts';
import { controlId, words } from '../../member-fields.ts';
import { holdWords } from '../../part-words.ts';
import { readable } from '../input-row.tsx';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { focusControl } from '../stale-notice.tsx';
import { Part } from './part.tsx';
import { WordChoice } from './word-choice.tsx';

/** The points held between the ends, in order from end A once the list is left. */
export function RestraintsPart({ units }: { units: 'us' | 'si' }) {
  const { draft, edit, editable } = useMemberForm();
  if (!draft.restraints) return null;
  const rows = restraintsOf(draft);
  return (
    <Part
      title="Held between the ends"
      onRemove={() => edit(withoutRestraints(draft), 'restraints/remove')}
    >
      {rows.length === 0 && (
        <p className="text-small text-zinc-7">
          Nowhere: every length is the whole member, between its held ends.
        </p>
      )}
      <ol
        className="border-t border-zinc-2 empty:border-0"
        onBlur={(event) => {
          if (editable && !event.currentTarget.contains(event.relatedTarget)) {
            edit(withOrder(draft), 'restraints/order');
          }
        }}
      >
        {rows.map((row, index) => (
          <RestraintRow key={row.id} row={row} index={index} units={units} />
        ))}
      </ol>
      {rows.length > 0 && (
        <p className="mt-1.5 text-small text-zinc-7">
          {lengthNames.some((name) => draft[name].text.trim() === '')
            ? 'Lengths in grey follow from these points. One typed in their place says why in its source.'
            : 'The lengths typed above stand in place of those that follow from these points.'}
        </p>
      )}
      {editable && (
        <Button
          size="small"
          id={controlId('restraints')}
          className="mt-2"
          onClick={() => {
            edit(withNewRestraint(draft), 'restraints/add');
            focusControl(`restraints[${rows.length}].at`);
          }}
        >
          Add a point
        </Button>
      )}
    </Part>
  );
}

const distance = (number: number) =>
  words(`Point r${number}`, 'z', 'from end A', 'Distance from end A.', false);

function RestraintRow(props: { row: DraftRestraint; index: number; units: 'us' | 'si' }) {
  const { row, index } = props;
  const { draft, edit, editable, problemAt } = useMemberForm();
  const path = `restraints[${index}]`;
  const problem = problemAt(`${path}.holds`);
  const id = controlId(`${path}.holds`);
  const called = row.at.trim() || `point ${index + 1}`;
  return (
    <li className="border-b border-zinc-2 pt-1 pb-2">
      <QuantityRow
        path={`${path}.at`}
        words={distance(index + 1)}
        quantity={{ text: row.at, source: row.source, confirmed: row.confirmed }}
        placeholder={props.units === 'us' ? 'ft from A' : 'm from A'}
        beside={
          editable && (
            <button
              type="button"
              aria-label={`Delete the point at ${called}`}
              className="link font-condensed text-small text-zinc-7"
              onClick={() => {
                edit(withoutRestraint(draft, row.id), 'restraints/delete');
                focusControl('restraints');
              }}
            >
              Delete
            </button>
          )
        }
        onChange={({ text, source, confirmed }) =>
          edit(
            withRestraint(draft, row.id, { at: text, source, confirmed }),
            `restraints/${row.id}/at`,
          )
        }
      />
      <div className="mt-0.5">
        <WordChoice
          id={id}
          label={`Held at ${called}`}
          words={holdWords}
          chosen={row.holds}
          invalid={problem !== undefined}
          describedBy={problem ? `${id}-problem` : undefined}
          disabled={!editable}
          onChoose={(hold) => edit(withHold(draft, row, hold), `restraints/${row.id}/${hold}`)}
        />
      </div>
      {problem && <ProblemText id={`${id}-problem`}>{readable(problem)}</ProblemText>}
    </li>
  );
}
