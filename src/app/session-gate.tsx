import { useQuery } from '@tanstack/react-query';
import { Outlet } from 'react-router-dom';
import { sessionQuery } from '#client/features/account/queries.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { SignInPage } from '#client/routes/sign-in-page.tsx';
import { Failure, Waiting } from '#client/ui/state-panels.tsx';

/** Lets signed-in people through; others sign in at the address they came for. */
export function SessionGate() {
  const session = useQuery(sessionQuery);
  if (session.data?.user) return <Outlet />;
  if (session.data) return <SignInPage session={session.data} />;
  if (session.error) {
    return (
      <main className="mx-auto max-w-xl px-6 py-16">
        <Failure title="Stanchion did not answer" onRetry={() => void session.refetch()}>
          {reasonOf(session.error)}
        </Failure>
      </main>
    );
  }
  return (
    <main className="px-6">
      <Waiting what="your desk" />
    </main>
  );
}
