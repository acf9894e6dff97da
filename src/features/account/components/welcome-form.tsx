import { useForm } from 'react-hook-form';
import { reasonOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import { useAcceptWelcome } from '../mutations.ts';
import { type NewPassword, NewPasswordFields } from './new-password-fields.tsx';

export function WelcomeForm(props: { token: string; email: string; onDone: () => void }) {
  const accept = useAcceptWelcome(props.token);
  const { register, handleSubmit, formState } = useForm<NewPassword>({
    defaultValues: { next: '', again: '' },
  });
  const submit = handleSubmit(({ next }) =>
    accept.mutate({ password: next }, { onSuccess: props.onDone }),
  );
  return (
    <form noValidate onSubmit={submit} className="grid gap-4">
      {accept.error && <Failure title={reasonOf(accept.error)} />}
      <input type="hidden" autoComplete="username" value={props.email} readOnly />
      <NewPasswordFields register={register} errors={formState.errors} />
      <div>
        <Button rank="main" type="submit" disabled={accept.isPending}>
          Set the password and go in
        </Button>
      </div>
    </form>
  );
}
