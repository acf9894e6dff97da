import { fieldClass } from '#client/ui/field.tsx';
import type { DraftChart } from '#shared/contracts/draft-parts.ts';
import { noJoints, withChart, withoutPart } from '../../edit-parts.ts';
import { chartWords, sideswayWords } from '../../part-words.ts';
import { InputRow } from '../input-row.tsx';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { Part, PartHead, PartLinks } from './part.tsx';

const axisWords = { x: 'Bending about x', y: 'Bending about y' } as const;

/** Joints of a column, for its buckling lengths by the alignment chart. */
export function ChartsPart() {
  const { draft, edit } = useMemberForm();
  const { charts } = draft;
  if (!charts) return null;
  return (
    <Part
      title="Alignment chart"
      onRemove={() => edit(withoutPart(draft, 'charts'), 'charts/remove')}
    >
      {(['x', 'y'] as const).map((axis) => {
        const chart = charts[axis];
        return chart && <ChartRows key={axis} axis={axis} chart={chart} />;
      })}
      <PartLinks
        lead="Also for"
        links={(['x', 'y'] as const)
          .filter((axis) => !charts[axis])
          .map((axis) => ({
            text: axisWords[axis].toLowerCase(),
            open: () => edit(withChart(draft, axis, noJoints), `charts/${axis}/add`),
            first: `charts.${axis}.sidesway`,
          }))}
      />
    </Part>
  );
}

function ChartRows({ axis, chart }: { axis: 'x' | 'y'; chart: DraftChart }) {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const change = (next: Partial<DraftChart>, field: string) =>
    edit(withChart(draft, axis, { ...chart, ...next }), `charts/${axis}/${field}`);
  const path = `charts.${axis}`;
  const problem = problemAt(`${path}.sidesway`);
  return (
    <div className="mt-1">
      <PartHead
        text={axisWords[axis]}
        action="Delete"
        onAction={() => edit(withChart(draft, axis, undefined), `charts/${axis}/delete`)}
      />
      <InputRow path={`${path}.sidesway`} label="Story" problem={problem}>
        {(control) => (
          <select
            {...control}
            value={chart.sidesway}
            disabled={!editable}
            onChange={({ target }) =>
              change({ sidesway: target.value as DraftChart['sidesway'] }, 'sidesway')
            }
            className={fieldClass(problem !== undefined)}
          >
            {Object.entries(sideswayWords).map(([value, text]) => (
              <option key={value} value={value}>
                {text}
              </option>
            ))}
          </select>
        )}
      </InputRow>
      {(['GA', 'GB'] as const).map((name) => (
        <QuantityRow
          key={name}
          path={`${path}.${name}`}
          words={chartWords[name]}
          quantity={chart[name]}
          onChange={(quantity) => change({ [name]: quantity }, name)}
        />
      ))}
    </div>
  );
}
