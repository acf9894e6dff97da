import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { useSignOut } from '../mutations.ts';
import { usePerson } from '../queries.ts';

/** Who I am, and out. */
export function AccountMenu() {
  const person = usePerson();
  const signOut = useSignOut();
  return (
    <>
      <Link
        to={paths.account}
        className="whitespace-nowrap text-zinc-2 hover:text-paper hover:underline"
      >
        {person.name}
      </Link>
      <button
        type="button"
        disabled={signOut.isPending}
        onClick={() => signOut.mutate()}
        className="whitespace-nowrap text-zinc-2 hover:text-paper hover:underline"
      >
        Sign out
      </button>
    </>
  );
}
