import { useForm } from 'react-hook-form';
import { reasonOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import { TextField } from '#client/ui/text-field.tsx';
import type { SessionState } from '#shared/contracts/account.ts';
import { useSignIn } from '../mutations.ts';
import { DemoAccounts } from './demo-accounts.tsx';

interface Values {
  email: string;
  password: string;
}

export function SignInForm({ demo }: { demo: SessionState['demo'] }) {
  const { register, handleSubmit, formState } = useForm<Values>({
    defaultValues: { email: '', password: '' },
  });
  const signIn = useSignIn();
  const { errors } = formState;
  return (
    <>
      <form
        noValidate
        onSubmit={handleSubmit((values) => signIn.mutate(values))}
        className="grid gap-4"
      >
        {signIn.error && <Failure title={reasonOf(signIn.error)} />}
        <TextField
          label="E-mail address"
          type="email"
          autoComplete="username"
          problem={errors.email?.message}
          {...register('email', { required: 'Your e-mail address is wanted' })}
        />
        <TextField
          label="Password"
          type="password"
          autoComplete="current-password"
          problem={errors.password?.message}
          {...register('password', { required: 'Your password is wanted' })}
        />
        <div>
          <Button rank="main" type="submit" disabled={signIn.isPending}>
            Sign in
          </Button>
        </div>
      </form>
      {demo && (
        <DemoAccounts
          demo={demo}
          disabled={signIn.isPending}
          onChoose={(email) => signIn.mutate({ email, password: demo.password })}
        />
      )}
    </>
  );
}
