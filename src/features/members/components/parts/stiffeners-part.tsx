import { withoutPart } from '../../edit-parts.ts';
import { stiffenerWords } from '../../part-words.ts';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { Part } from './part.tsx';

export function StiffenersPart({ units }: { units: 'us' | 'si' }) {
  const { draft, edit } = useMemberForm();
  if (!draft.stiffeners) return null;
  return (
    <Part
      title="Web stiffeners"
      onRemove={() => edit(withoutPart(draft, 'stiffeners'), 'stiffeners/remove')}
    >
      <QuantityRow
        path="stiffeners"
        words={stiffenerWords}
        quantity={draft.stiffeners}
        placeholder={units === 'us' ? 'in' : 'mm'}
        onChange={(stiffeners) => edit({ ...draft, stiffeners }, 'stiffeners')}
      />
    </Part>
  );
}
