import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** A state in a word, framed; oxide where it wants attention. */
export function Tag({
  tone = 'plain',
  children,
}: {
  tone?: 'plain' | 'asks' | 'ink';
  children: ReactNode;
}) {
  const tones = {
    plain: 'border-zinc-3 text-ink',
    asks: 'border-oxide text-oxide',
    ink: 'border-zinc-5 text-paper',
  };
  return (
    <span
      className={classNames(
        'inline-block rounded-field border px-1.5 py-px font-condensed text-small font-medium whitespace-nowrap',
        tones[tone],
      )}
    >
      {children}
    </span>
  );
}
