import { useRouteError } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';

/** The page itself failed. What was typed is kept on this device and comes back with the page. */
export function ErrorPage() {
  const error = useRouteError();
  return (
    <main className="mx-auto my-14 max-w-[720px] bg-paper px-10 pt-9 pb-12 shadow-sheet">
      <h1 className="border-b-2 border-ink pb-4 font-serif text-display font-semibold">
        This page failed
      </h1>
      <p className="mt-5 font-serif text-head">
        {reasonOf(error)} Input that was not saved yet is kept in this browser and comes back with
        the page.
      </p>
      <div className="mt-5 flex gap-2">
        <Button rank="main" onClick={() => window.location.reload()}>
          Load the page again
        </Button>
        <Button onClick={() => window.location.assign(paths.desk)}>To your desk</Button>
      </div>
      {error instanceof Error && (
        <details className="mt-6 text-small text-zinc-7">
          <summary>What the browser says</summary>
          <pre className="mt-2 overflow-x-auto font-mono whitespace-pre-wrap">{error.message}</pre>
        </details>
      )}
    </main>
  );
}
