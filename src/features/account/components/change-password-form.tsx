import { type UseFormRegister, useForm } from 'react-hook-form';
import { reasonOf, refusalOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import { TextField } from '#client/ui/text-field.tsx';
import { useChangePassword } from '../mutations.ts';
import { type NewPassword, NewPasswordFields } from './new-password-fields.tsx';

interface Values extends NewPassword {
  current: string;
}

export function ChangePasswordForm() {
  const change = useChangePassword();
  const announce = useAnnounce();
  const { register, handleSubmit, formState, reset } = useForm<Values>({
    defaultValues: { current: '', next: '', again: '' },
  });
  const submit = handleSubmit(({ current, next }) =>
    change.mutate(
      { current, next },
      {
        onSuccess: () => {
          reset();
          announce('Password changed. Your other sessions have ended.');
        },
      },
    ),
  );
  return (
    <form noValidate onSubmit={submit} className="grid max-w-80 gap-4">
      {change.error && !refusalOf(change.error, 'current') && (
        <Failure title={reasonOf(change.error)} />
      )}
      <TextField
        label="Present password"
        type="password"
        autoComplete="current-password"
        problem={formState.errors.current?.message ?? refusalOf(change.error, 'current')}
        {...register('current', { required: 'Your present password is wanted' })}
      />
      <NewPasswordFields
        register={register as unknown as UseFormRegister<NewPassword>}
        errors={formState.errors}
      />
      <div>
        <Button rank="main" type="submit" disabled={change.isPending}>
          Change the password
        </Button>
      </div>
    </form>
  );
}
