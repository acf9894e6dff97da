import { Button } from '#client/ui/button.tsx';
import type { SessionState } from '#shared/contracts/account.ts';

/** The invented people of the demo firm, only where the server says that this is a demo. */
export function DemoAccounts(props: {
  demo: NonNullable<SessionState['demo']>;
  disabled: boolean;
  onChoose: (email: string) => void;
}) {
  const { demo, disabled, onChoose } = props;
  return (
    <section aria-labelledby="demo-accounts" className="mt-9">
      <h2 id="demo-accounts" className="caps border-b border-zinc-3 pb-1.5">
        Demo accounts
      </h2>
      <ul>
        {demo.accounts.map((account) => (
          <li
            key={account.email}
            className="grid grid-cols-[1fr_auto] items-center gap-3 border-b border-zinc-1 py-1.5"
          >
            <span>
              <span className="font-semibold">{account.name}</span>, {account.role}
              <span className="block text-small text-zinc-7">{account.email}</span>
            </span>
            <Button
              size="small"
              disabled={disabled}
              onClick={() => onChoose(account.email)}
              aria-label={`Sign in as ${account.name}, ${account.role}`}
            >
              Sign in
            </Button>
          </li>
        ))}
      </ul>
      <p className="mt-2 text-small text-zinc-7">
        All with the password <code className="font-mono text-ink">{demo.password}</code>. People,
        firm and project are invented.
      </p>
    </section>
  );
}
