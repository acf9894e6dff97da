import { when } from '#client/lib/clock.ts';
import { count } from '#client/lib/count.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from './announcements.tsx';
import { Button } from './button.tsx';

export interface Deleted {
  readonly id: string;
  /** Mark or number. */
  readonly name: string;
  /** Section or title. */
  readonly detail: string;
  readonly deletedAt: string;
  readonly deletedBy: string;
}

interface Outcome {
  onSuccess: () => void;
  onError: (error: Error) => void;
}

/** What was deleted of a list, folded away, each with the way back; nothing where nothing was. */
export function DeletedList(props: {
  /** One of them in words: `deleted member`. */
  what: string;
  deleted: readonly Deleted[];
  restore: (id: string, outcome: Outcome) => void;
  /** What is announced once one is back. */
  restored: (name: string) => string;
  className: string;
}) {
  const { what, deleted, restore, restored, className } = props;
  const announce = useAnnounce();
  if (deleted.length === 0) return null;
  return (
    <details className={`${className} text-small text-zinc-7`}>
      <summary>{count(deleted.length, what)}</summary>
      <ul className="mt-1">
        {deleted.map(({ id, name, detail, deletedAt, deletedBy }) => (
          <li key={id} className="flex items-baseline gap-3 py-1">
            <span className="text-ink">
              {name} {detail}
            </span>
            <span>
              {when(deletedAt)}, {deletedBy}
            </span>
            <Button
              size="small"
              rank="quiet"
              aria-label={`Restore ${name}`}
              onClick={() =>
                restore(id, {
                  onSuccess: () => announce(restored(name)),
                  onError: (error) => announce(reasonOf(error)),
                })
              }
            >
              Restore
            </Button>
          </li>
        ))}
      </ul>
    </details>
  );
}
