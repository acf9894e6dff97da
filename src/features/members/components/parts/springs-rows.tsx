import { springNames } from '#shared/contracts/draft-parts.ts';
import { inSprings } from '#shared/contracts/members.ts';
import { noSprings } from '../../edit-parts.ts';
import { springWords } from '../../part-words.ts';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';

/** Rotational stiffnesses of the ends, where these stand in springs. */
export function SpringsRows({ units }: { units: 'us' | 'si' }) {
  const { draft, edit } = useMemberForm();
  if (!inSprings(draft)) return null;
  const springs = draft.springs ?? noSprings;
  return springNames.map((name) => (
    <QuantityRow
      key={name}
      path={`springs.${name}`}
      words={springWords[name]}
      quantity={springs[name]}
      placeholder={units === 'us' ? 'kip ft/rad' : 'kN m/rad'}
      onChange={(quantity) =>
        edit({ ...draft, springs: { ...springs, [name]: quantity } }, `springs/${name}`)
      }
    />
  ));
}
