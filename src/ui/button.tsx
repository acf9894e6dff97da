import type { ComponentProps } from 'react';
import { classNames } from './class-names.ts';

type Rank = 'main' | 'plain' | 'quiet' | 'grave';

const ranks: Record<Rank, string> = {
  main: 'border border-ink bg-ink text-paper hover:bg-zinc-7 hover:border-zinc-7',
  plain: 'border border-ink bg-paper text-ink hover:bg-zinc-1',
  quiet: 'border border-transparent text-ink hover:border-zinc-3 hover:bg-zinc-1',
  grave: 'border border-oxide bg-paper text-oxide hover:bg-oxide-2',
};

const shape =
  'inline-flex items-center justify-center gap-2 rounded-field font-medium whitespace-nowrap disabled:opacity-60 disabled:pointer-events-none';
const sizes = { body: 'h-8 px-3', small: 'h-6.5 px-2 text-small' } as const;

interface Look {
  rank?: Rank;
  size?: keyof typeof sizes;
}

export function Button({
  rank = 'plain',
  size = 'body',
  className,
  ...rest
}: Look & ComponentProps<'button'>) {
  return (
    <button
      type="button"
      className={classNames(shape, sizes[size], ranks[rank], className)}
      {...rest}
    />
  );
}
