import type { ReactNode } from 'react';
import { Button } from './button.tsx';

/** Nothing here yet: what would stand here and how to begin. */
export function Empty({ children, action }: { children: ReactNode; action?: ReactNode }) {
  return (
    <div className="border-y border-zinc-2 py-7 text-zinc-7">
      <div className="max-w-[62ch] font-serif text-head">{children}</div>
      {action && <div className="mt-3">{action}</div>}
    </div>
  );
}

/** A failure in plain words with a way on. */
export function Failure(props: { title: string; children?: ReactNode; onRetry?: () => void }) {
  return (
    <div role="alert" className="border-l-3 border-oxide bg-oxide-2 px-4 py-3">
      <p className="font-semibold">{props.title}</p>
      {props.children && <div className="mt-0.5">{props.children}</div>}
      {props.onRetry && (
        <Button size="small" className="mt-2" onClick={props.onRetry}>
          Try again
        </Button>
      )}
    </div>
  );
}

/** Stands in for something that is on its way; quiet, as it is rarely seen. */
export function Waiting({ what }: { what: string }) {
  return (
    <p role="status" className="py-6 text-zinc-7">
      Fetching {what} …
    </p>
  );
}
