import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** An aside in a margin: a rule at its left, oxide where it asks for something. */
export function Note({
  tone = 'plain',
  children,
}: {
  tone?: 'plain' | 'asks';
  children: ReactNode;
}) {
  return (
    <div
      className={classNames(
        'border-l-2 py-0.5 pl-3 text-small',
        tone === 'asks' ? 'border-oxide text-ink' : 'border-zinc-3 text-zinc-7',
      )}
    >
      {children}
    </div>
  );
}
