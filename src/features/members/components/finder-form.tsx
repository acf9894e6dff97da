import { SelectField, TextField } from '#client/ui/text-field.tsx';
import { SEARCH_FAMILIES } from '#shared/members/section-candidates.ts';
import type { FinderCriteria, LimitName } from '../finder-criteria.ts';
import { familyWords } from '../finder-words.ts';
import { readable } from './input-row.tsx';

const fields: readonly { readonly name: LimitName; readonly label: string }[] = [
  { name: 'minDepth', label: 'Depth, at least' },
  { name: 'maxDepth', label: 'Depth, at most' },
  { name: 'minWidth', label: 'Width, at least' },
  { name: 'maxWidth', label: 'Width, at most' },
];

/** Which sections are tried. */
export function FinderForm(props: {
  criteria: FinderCriteria;
  units: 'us' | 'si';
  problems: Readonly<Partial<Record<LimitName, string>>>;
  onChange: (criteria: FinderCriteria) => void;
}) {
  const { criteria, problems, onChange } = props;
  return (
    <div className="grid grid-cols-[minmax(190px,1.5fr)_repeat(4,minmax(104px,1fr))] items-start gap-x-4 border-y border-zinc-2 py-3">
      <SelectField
        label="Kind of section"
        value={criteria.family}
        options={SEARCH_FAMILIES.map((value) => ({ value, text: familyWords[value].title }))}
        onValue={(family) => onChange({ ...criteria, family })}
      />
      {fields.map(({ name, label }) => {
        const problem = problems[name];
        return (
          <TextField
            key={name}
            label={label}
            value={criteria.limits[name]}
            maxLength={60}
            autoComplete="off"
            spellCheck={false}
            placeholder={props.units === 'us' ? 'in' : 'mm'}
            problem={problem && readable(problem)}
            className="figures text-right"
            onChange={({ target }) =>
              onChange({ ...criteria, limits: { ...criteria.limits, [name]: target.value } })
            }
          />
        );
      })}
    </div>
  );
}
