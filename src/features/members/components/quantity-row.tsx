import type { ReactNode } from 'react';
import { fieldClass } from '#client/ui/field.tsx';
import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import { withText } from '../edit-draft.ts';
import type { FieldWords } from '../member-fields.ts';
import { placeWords } from '../place-words.ts';
import { InputRow, SymbolLabel } from './input-row.tsx';
import { useMemberForm } from './member-form-context.ts';
import { SourceControl } from './source-control.tsx';

/** A quantity as typed, with the ring that says where it comes from. */
export function QuantityRow(props: {
  path: string;
  words: FieldWords;
  quantity: DraftQuantity;
  placeholder?: string;
  beside?: ReactNode;
  /** false where another field's ring stands for this value too. */
  withSource?: boolean;
  onChange: (quantity: DraftQuantity) => void;
}) {
  const { path, words, quantity, onChange } = props;
  const { editable, problemAt } = useMemberForm();
  const problem = problemAt(path);
  return (
    <InputRow
      path={path}
      problem={problem}
      label={<SymbolLabel words={words} />}
      beside={props.beside}
      source={
        props.withSource !== false &&
        quantity.text.trim() !== '' && (
          <SourceControl
            what={`${words.label} ${words.spoken}`}
            printed={placeWords(path)}
            stated={quantity}
            onChange={(stated) => onChange({ ...quantity, ...stated })}
          />
        )
      }
    >
      {(control) => (
        <input
          {...control}
          value={quantity.text}
          readOnly={!editable}
          maxLength={60}
          autoComplete="off"
          spellCheck={false}
          title={words.about}
          placeholder={props.placeholder}
          onChange={(event) => onChange(withText(quantity, event.target.value))}
          className={fieldClass(problem !== undefined, 'figures text-right')}
        />
      )}
    </InputRow>
  );
}
