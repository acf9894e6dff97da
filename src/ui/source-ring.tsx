import type { ComponentProps } from 'react';
import { classNames } from './class-names.ts';

export type SourceLetter = 'T' | 'F' | 'D' | 'A';

const ring = (letter: SourceLetter, confirmed: boolean) =>
  classNames(
    'inline-flex size-5 shrink-0 items-center justify-center rounded-full border font-condensed text-tiny font-semibold',
    letter === 'A' ? 'border-dashed border-oxide text-oxide' : 'border-zinc-5 text-zinc-7',
    !confirmed && letter !== 'A' && 'border-dashed border-oxide text-oxide',
  );

/** Where a given value comes from: T typed, F file, D drawing, A assumption; dashed while open. */
export function SourceRing(props: { letter: SourceLetter; confirmed: boolean; label?: string }) {
  return (
    <span
      className={ring(props.letter, props.confirmed)}
      {...(props.label ? { role: 'img', 'aria-label': props.label } : { 'aria-hidden': true })}
    >
      {props.letter}
    </span>
  );
}

export function SourceRingButton({
  letter,
  confirmed,
  ...rest
}: { letter: SourceLetter; confirmed: boolean } & ComponentProps<'button'>) {
  return (
    <button
      type="button"
      {...rest}
      className={classNames('rounded-full p-0.5 hover:bg-zinc-2', rest.className)}
    >
      <SourceRing letter={letter} confirmed={confirmed} />
    </button>
  );
}
