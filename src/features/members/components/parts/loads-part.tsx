import { Button } from '#client/ui/button.tsx';
import type { DraftCombination } from '#shared/contracts/members.ts';
import { withNewLoad, withoutLoads } from '../../edit-loads.ts';
import { controlId } from '../../member-fields.ts';
import { useMemberForm } from '../member-form-context.ts';
import { focusControl } from '../stale-notice.tsx';
import { LoadRow } from './load-row.tsx';
import { Part } from './part.tsx';

/** The loads between the ends under one combination. */
export function LoadsPart(props: { row: DraftCombination; at: string; units: 'us' | 'si' }) {
  const { row, at, units } = props;
  const { draft, edit, editable } = useMemberForm();
  if (!row.loads?.length) return null;
  const loads = row.loads;
  return (
    <Part
      title="Loads between the ends"
      onRemove={() => edit(withoutLoads(draft, row.id), `${row.id}/loads/remove`)}
    >
      <ol className="border-t border-zinc-2">
        {loads.map((load, index) => (
          <LoadRow
            key={load.id}
            row={row.id}
            load={load}
            index={index}
            path={`${at}.loads[${index}]`}
            units={units}
          />
        ))}
      </ol>
      {editable && (
        <Button
          size="small"
          id={controlId(`${at}.loads`)}
          className="mt-2"
          onClick={() => {
            edit(withNewLoad(draft, row.id), `${row.id}/loads/add`);
            focusControl(`${at}.loads[${loads.length}].kind`);
          }}
        >
          Add a load
        </Button>
      )}
    </Part>
  );
}
