import type { ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** A sheet of paper on the bench. */
export function Paper({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <div
      data-print-plain
      className={classNames('mx-auto w-full max-w-[1180px] bg-paper shadow-sheet', className)}
    >
      {children}
    </div>
  );
}

/** Title of a paper with what it is about under it. */
export function PaperHead(props: { title: ReactNode; sub?: ReactNode; actions?: ReactNode }) {
  return (
    <header className="flex items-end justify-between gap-x-6 border-b-2 border-ink pb-5">
      <div className="min-w-0 flex-1">
        <h1 className="font-serif text-display font-semibold">{props.title}</h1>
        {props.sub && <p className="mt-1 text-zinc-7">{props.sub}</p>}
      </div>
      {props.actions && <div className="flex shrink-0 gap-2">{props.actions}</div>}
    </header>
  );
}

/** Heading of a part of a paper. */
export function PartHead(props: { title: ReactNode; actions?: ReactNode; id?: string }) {
  return (
    <div className="mt-9 mb-2 flex items-end justify-between gap-4">
      <h2 {...(props.id ? { id: props.id } : {})} className="font-serif text-head font-semibold">
        {props.title}
      </h2>
      {props.actions && <div className="flex flex-wrap gap-2">{props.actions}</div>}
    </div>
  );
}
