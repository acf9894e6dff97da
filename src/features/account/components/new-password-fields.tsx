import type { FieldErrors, UseFormRegister } from 'react-hook-form';
import { TextField } from '#client/ui/text-field.tsx';
import { passwordMinimum } from '#shared/contracts/account.ts';

export interface NewPassword {
  next: string;
  again: string;
}

const tooShort = `At least ${passwordMinimum} characters`;

/** A new password, typed twice. Its length is its only rule. */
export function NewPasswordFields(props: {
  register: UseFormRegister<NewPassword>;
  errors: FieldErrors<NewPassword>;
}) {
  return (
    <>
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        hint={`${tooShort}; a few words in a row do well.`}
        problem={props.errors.next?.message}
        {...props.register('next', {
          required: 'A new password is wanted',
          minLength: { value: passwordMinimum, message: tooShort },
          maxLength: { value: 200, message: 'At most 200 characters' },
        })}
      />
      <TextField
        label="The same once more"
        type="password"
        autoComplete="new-password"
        problem={props.errors.again?.message}
        {...props.register('again', {
          validate: (again, { next }) => again === next || 'The two are not the same',
        })}
      />
    </>
  );
}
