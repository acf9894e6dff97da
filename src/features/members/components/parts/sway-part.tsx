import { fieldClass } from '#client/ui/field.tsx';
import type { DraftSway, DraftSwayDirection, SwayName } from '#shared/contracts/draft-parts.ts';
import type { DraftCombination } from '#shared/contracts/members.ts';
import { noSwayAbout, withoutSway, withSway } from '../../edit-loads.ts';
import { frameWords, swayAxialWords, swayWords } from '../../part-words.ts';
import { InputRow } from '../input-row.tsx';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { Part, PartHead, PartLinks } from './part.tsx';

const axisWords = { x: 'Sway that bends about x', y: 'Sway that bends about y' } as const;

const units = {
  us: { force: 'kip', moment: 'kip ft', height: 'ft', drift: 'in' },
  si: { force: 'kN', moment: 'kN m', height: 'm', drift: 'mm' },
} as const;

/** What goes with lateral translation under one combination, for B2 (App. 8.1.3). */
export function SwayPart(props: { row: DraftCombination; at: string; units: 'us' | 'si' }) {
  const { row } = props;
  const { draft, edit } = useMemberForm();
  const { sway } = row;
  if (!sway) return null;
  const path = `${props.at}.sway`;
  const change = (next: DraftSway, field: string) =>
    edit(withSway(draft, row.id, next), `${row.id}/sway/${field}`);
  const about = (axis: 'x' | 'y', direction: DraftSwayDirection | undefined, field: string) => {
    const { [axis]: _, ...rest } = sway;
    change(direction ? { ...rest, [axis]: direction } : rest, `${axis}/${field}`);
  };
  return (
    <Part
      title="Sway of the story"
      onRemove={() => edit(withoutSway(draft, row.id), `${row.id}/sway/remove`)}
    >
      <QuantityRow
        path={`${path}.P`}
        words={swayAxialWords}
        quantity={sway.P}
        placeholder={units[props.units].force}
        onChange={(P) => change({ ...sway, P }, 'P')}
      />
      {(['x', 'y'] as const).map((axis) => {
        const direction = sway[axis];
        return (
          direction && (
            <SwayRows
              key={axis}
              title={axisWords[axis]}
              path={`${path}.${axis}`}
              sway={direction}
              units={props.units}
              onChange={(next, field) => about(axis, next, field)}
            />
          )
        );
      })}
      <PartLinks
        lead="Also"
        links={(['x', 'y'] as const)
          .filter((axis) => !sway[axis])
          .map((axis) => ({
            text: axisWords[axis].toLowerCase(),
            open: () => about(axis, noSwayAbout, 'add'),
            first: `${path}.${axis}.MA`,
          }))}
      />
    </Part>
  );
}

const placeholders = (of: 'us' | 'si'): Readonly<Partial<Record<SwayName, string>>> => {
  const { force, moment, height, drift } = units[of];
  return {
    ...{ MA: moment, MB: moment, Pstory: force, PeStory: force, H: force, Pmf: force },
    ...{ height, drift },
  };
};

function SwayRows(props: {
  title: string;
  path: string;
  sway: DraftSwayDirection;
  units: 'us' | 'si';
  onChange: (next: DraftSwayDirection | undefined, field: string) => void;
}) {
  const { path, sway, onChange } = props;
  const { editable, problemAt } = useMemberForm();
  const framesProblem = problemAt(`${path}.frames`);
  const usual = placeholders(props.units);
  const rows = (names: readonly SwayName[]) =>
    names.map((name) => (
      <QuantityRow
        key={name}
        path={`${path}.${name}`}
        words={swayWords[name]}
        quantity={sway[name]}
        placeholder={usual[name] ?? ''}
        onChange={(quantity) => onChange({ ...sway, [name]: quantity }, name)}
      />
    ));
  return (
    <div className="mt-2 border-t border-zinc-2 pt-1.5">
      <PartHead text={props.title} action="Delete" onAction={() => onChange(undefined, 'delete')} />
      {rows(['MA', 'MB', 'Pstory'])}
      <InputRow path={`${path}.by`} label="Stiffness by" problem={undefined}>
        {(control) => (
          <select
            {...control}
            value={sway.by}
            disabled={!editable}
            title="How stiff the story is against sway"
            onChange={({ target }) =>
              onChange({ ...sway, by: target.value as DraftSwayDirection['by'] }, 'by')
            }
            className={fieldClass(false)}
          >
            <option value="drift">shear and drift</option>
            <option value="critical">critical load</option>
          </select>
        )}
      </InputRow>
      {rows(sway.by === 'critical' ? ['PeStory'] : ['H', 'height', 'drift'])}
      {sway.by === 'drift' && (
        <InputRow path={`${path}.frames`} label="Moment frames" problem={framesProblem}>
          {(control) => (
            <select
              {...control}
              value={sway.frames}
              disabled={!editable}
              title="What of the story’s load stands on columns of moment frames, for R_M (A-8-8)"
              onChange={({ target }) =>
                onChange(
                  { ...sway, frames: target.value as DraftSwayDirection['frames'] },
                  'frames',
                )
              }
              className={fieldClass(framesProblem !== undefined)}
            >
              {Object.entries(frameWords).map(([value, text]) => (
                <option key={value} value={value}>
                  {text}
                </option>
              ))}
            </select>
          )}
        </InputRow>
      )}
      {sway.by === 'drift' && sway.frames === 'share' && rows(['Pmf'])}
    </div>
  );
}
