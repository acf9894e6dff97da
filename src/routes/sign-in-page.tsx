import { Front } from '#client/app/front.tsx';
import { SignInForm } from '#client/features/account/components/sign-in-form.tsx';
import type { SessionState } from '#shared/contracts/account.ts';

export function SignInPage({ session }: { session: SessionState }) {
  return (
    <Front title="Sign in">
      <SignInForm demo={session.demo} />
    </Front>
  );
}
