import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { Front } from '#client/app/front.tsx';
import { paths } from '#client/app/paths.ts';
import { WelcomeForm } from '#client/features/account/components/welcome-form.tsx';
import { welcomeQuery } from '#client/features/account/queries.ts';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { Failure, Waiting } from '#client/ui/state-panels.tsx';

export function Component() {
  const { token = '' } = useParams();
  const welcome = useQuery(welcomeQuery(token));
  const navigate = useNavigate();
  return (
    <Front title="Welcome">
      {welcome.data && (
        <>
          <p className="mb-5">
            {welcome.data.name}, {welcome.data.email}: choose the password of your account with{' '}
            {welcome.data.firm}.
          </p>
          <WelcomeForm
            token={token}
            email={welcome.data.email}
            onDone={() => navigate(paths.desk, { replace: true })}
          />
        </>
      )}
      {welcome.isPending && <Waiting what="your invitation" />}
      {welcome.error && <Refused error={welcome.error} onRetry={() => void welcome.refetch()} />}
    </Front>
  );
}

function Refused({ error, onRetry }: { error: Error; onRetry: () => void }) {
  if (!isProblem(error, 'not-found') && !isProblem(error, 'invalid-request')) {
    return <Failure title={reasonOf(error)} onRetry={onRetry} />;
  }
  return (
    <Failure title="This link opens nothing any more">
      It works once, within 72 hours. Ask whoever sent it for another, or{' '}
      <Link to={paths.desk} className="link">
        sign in
      </Link>{' '}
      if you have a password.
    </Failure>
  );
}
