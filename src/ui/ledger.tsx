import type { ComponentProps, ReactNode } from 'react';
import { classNames } from './class-names.ts';

/** A table as a document has it: a rule under the head, hairlines between rows. */
export function Ledger(props: {
  caption: string;
  head: ReactNode;
  children: ReactNode;
  className?: string;
}) {
  return (
    <div className="overflow-x-auto">
      <table
        className={classNames('w-full border-collapse font-condensed text-body', props.className)}
      >
        <caption className="sr-only">{props.caption}</caption>
        <thead>
          <tr className="border-b-2 border-ink">{props.head}</tr>
        </thead>
        <tbody>{props.children}</tbody>
      </table>
    </div>
  );
}

export function HeadCell({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th
      scope="col"
      className={classNames(
        'py-1.5 pr-4 text-left align-bottom text-small font-semibold text-zinc-7',
        className,
      )}
      {...rest}
    />
  );
}

export function Row({ className, ...rest }: ComponentProps<'tr'>) {
  return <tr className={classNames('border-b border-zinc-2', className)} {...rest} />;
}

export function Cell({ className, ...rest }: ComponentProps<'td'>) {
  return <td className={classNames('py-2 pr-4 align-baseline', className)} {...rest} />;
}

export function RowHead({ className, ...rest }: ComponentProps<'th'>) {
  return (
    <th
      scope="row"
      className={classNames('py-2 pr-4 text-left align-baseline font-semibold', className)}
      {...rest}
    />
  );
}
