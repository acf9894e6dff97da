import { fieldClass } from '#client/ui/field.tsx';
import type { DraftSteel } from '#shared/contracts/members.ts';
import { STEELS } from '#shared/members/material.ts';
import { InputRow } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { SourceControl } from './source-control.tsx';

const own = 'own';

/** A grade of the list, or a steel of the user's own with its yield stress and source. */
export function SteelFields() {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const steel = draft.ownSteel;
  const listed = STEELS.some(({ key }) => key === draft.material);
  const choose = (value: string) =>
    edit(
      value === own
        ? { ...draft, ownSteel: { name: '', Fy: '', Fu: '', confirmed: false } }
        : { ...draft, material: value, ownSteel: null },
      'material/chosen',
    );
  return (
    <>
      <InputRow path="material" label="Steel" problem={steel ? undefined : problemAt('material')}>
        {(control) => (
          <select
            {...control}
            value={steel ? own : draft.material}
            disabled={!editable}
            onChange={(event) => choose(event.target.value)}
            className={fieldClass(!steel && problemAt('material') !== undefined)}
          >
            {!steel && !listed && (
              <option value={draft.material}>{draft.material || 'choose'}</option>
            )}
            {STEELS.map(({ key }) => (
              <option key={key} value={key}>
                {key}
              </option>
            ))}
            <option value={own}>own steel</option>
          </select>
        )}
      </InputRow>
      {steel && <OwnSteel steel={steel} />}
    </>
  );
}

const ownFields = [
  { name: 'name', label: 'Steel name', path: 'material.name' },
  { name: 'Fy', label: 'Yield Fy', path: 'material.Fy' },
  { name: 'Fu', label: 'Tensile Fu', path: 'material.Fu' },
] as const;

function OwnSteel({ steel }: { steel: DraftSteel }) {
  const { draft, edit, editable, problemAt } = useMemberForm();
  const change = (next: Partial<DraftSteel>, field: string) =>
    edit({ ...draft, ownSteel: { ...steel, ...next } }, `ownSteel/${field}`);
  return ownFields.map(({ name, label, path }) => {
    const problem =
      problemAt(path) ??
      (name === 'Fy' ? (problemAt('material.source') ?? problemAt('material')) : undefined);
    return (
      <InputRow
        key={name}
        path={path}
        label={label}
        problem={problem}
        {...(name === 'Fy'
          ? {
              source: (
                <SourceControl
                  what="the yield stress"
                  stated={steel}
                  onChange={(stated) => change(stated, 'source')}
                />
              ),
            }
          : {})}
      >
        {(control) => (
          <input
            {...control}
            value={steel[name]}
            readOnly={!editable}
            maxLength={60}
            autoComplete="off"
            onChange={(event) => change({ [name]: event.target.value, confirmed: false }, name)}
            className={fieldClass(problem !== undefined, name === 'name' ? '' : 'text-right')}
          />
        )}
      </InputRow>
    );
  });
}
