import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** A box, or one of several to choose from, with its words: all of its row takes the pointer. */
export function Choice({
  children,
  className,
  ...input
}: ComponentProps<'input'> & { type: 'checkbox' | 'radio'; children: ReactNode }) {
  return (
    <label className={classNames('flex min-h-7 items-center gap-2', className)}>
      <input {...input} className="size-4 shrink-0 accent-oxide" />
      {children}
    </label>
  );
}
