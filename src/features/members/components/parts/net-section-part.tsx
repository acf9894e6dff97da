import { fieldClass } from '#client/ui/field.tsx';
import type { DraftNetSection } from '#shared/contracts/draft-parts.ts';
import { withoutPart } from '../../edit-parts.ts';
import { netSectionWords } from '../../part-words.ts';
import { InputRow } from '../input-row.tsx';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { Part } from './part.tsx';

/** Net section for rupture in tension: Ae itself, or An with the shear lag factor. */
export function NetSectionPart({ units }: { units: 'us' | 'si' }) {
  const { draft, edit, editable } = useMemberForm();
  const net = draft.netSection;
  if (!net) return null;
  const change = (next: Partial<DraftNetSection>, field: string) =>
    edit({ ...draft, netSection: { ...net, ...next } }, `netSection/${field}`);
  const names = net.by === 'Ae' ? (['Ae'] as const) : (['An', 'U'] as const);
  return (
    <Part
      title="Net section"
      onRemove={() => edit(withoutPart(draft, 'netSection'), 'netSection/remove')}
    >
      <InputRow path="netSection.by" label="Given as" problem={undefined}>
        {(control) => (
          <select
            {...control}
            value={net.by}
            disabled={!editable}
            onChange={({ target }) => change({ by: target.value as DraftNetSection['by'] }, 'by')}
            className={fieldClass(false)}
          >
            <option value="An">net area and U</option>
            <option value="Ae">effective area</option>
          </select>
        )}
      </InputRow>
      {names.map((name) => (
        <QuantityRow
          key={name}
          path={`netSection.${name}`}
          words={netSectionWords[name]}
          quantity={net[name]}
          placeholder={name === 'U' ? 'at most 1' : units === 'us' ? 'in²' : 'mm²'}
          onChange={(quantity) => change({ [name]: quantity }, name)}
        />
      ))}
    </Part>
  );
}
