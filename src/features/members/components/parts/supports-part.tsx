import { notGiven } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination } from '#shared/contracts/members.ts';
import { withoutSupports, withSupport } from '../../edit-loads.ts';
import { bendsAbout, holdsAcross, restraintsOf } from '../../edit-restraints.ts';
import { words } from '../../member-fields.ts';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { Part, PartHead } from './part.tsx';

const axes = [
  { axis: 'x', name: 'Mx', label: 'Major' },
  { axis: 'y', name: 'My', label: 'Minor' },
] as const;

/** Moments where the member runs over the points that hold it, under one combination. */
export function SupportsPart(props: { row: DraftCombination; at: string; units: 'us' | 'si' }) {
  const { row, at } = props;
  const { draft, edit, problemAt } = useMemberForm();
  const points = restraintsOf(draft);
  const supports = row.supports ?? [];
  const rows = points.flatMap((point) =>
    axes.flatMap(({ axis, name, label }) => {
      const index = supports.findIndex(({ restraint }) => restraint === point.id);
      const quantity = supports[index]?.[name] ?? notGiven;
      const asked = holdsAcross(point, axis) && (row.supports || bendsAbout(row, axis));
      if (!asked && quantity.text === '') return [];
      const path = `${at}.supports[${index < 0 ? point.id : index}].${name}`;
      return [{ key: `${point.id}/${name}`, point, name, label, quantity, path }];
    }),
  );
  const left = supports.filter(({ restraint }) => !points.some(({ id }) => id === restraint));
  if (rows.length === 0 && left.length === 0 && !row.supports) return null;
  return (
    <Part
      title="Moments over the held points"
      {...(row.supports
        ? { onRemove: () => edit(withoutSupports(draft, row.id), `${row.id}/supports/remove`) }
        : {})}
    >
      {rows.length === 0 && left.length === 0 && (
        <p className="text-small text-zinc-7">
          No point between the ends holds a plane of bending.
        </p>
      )}
      {rows.map(({ key, point, name, label, quantity, path }) => (
        <QuantityRow
          key={key}
          path={path}
          words={words(
            `${label}, at ${point.at.trim() || '…'}`,
            'M',
            '',
            'In the sense of the end moments that bend the member in single curvature.',
            false,
          )}
          quantity={quantity}
          placeholder={props.units === 'us' ? 'kip ft' : 'kN m'}
          onChange={(next) =>
            edit(
              withSupport(draft, row.id, point.id, { [name]: next }),
              `${row.id}/supports/${key}`,
            )
          }
        />
      ))}
      {left.map(({ restraint, Mx, My }, index) => (
        <div key={restraint} className="border-l-2 border-oxide pl-3 text-small">
          <PartHead
            text={`Moments ${[Mx.text, My.text].filter(Boolean).join(', ')}`}
            action="Delete"
            onAction={() =>
              edit(
                withSupport(draft, row.id, restraint, { Mx: notGiven, My: notGiven }),
                `${row.id}/supports/delete`,
              )
            }
          />
          {problemAt(`${at}.supports[${index}].at`) && 'The point that they were over is gone.'}
        </div>
      ))}
    </Part>
  );
}
