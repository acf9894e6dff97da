import { type ReactNode, useId } from 'react';
import { classNames } from './class-names.ts';

export const fieldClass = (invalid: boolean, extra?: string) =>
  classNames(
    'h-8 w-full min-w-0 rounded-field border bg-paper px-2 text-ink',
    '[&[readonly]]:bg-transparent disabled:bg-transparent disabled:text-zinc-7',
    invalid ? 'border-oxide' : 'border-zinc-3 hover:border-zinc-5',
    extra,
  );

/** What a control needs to be tied to its label, its hint and its problem. */
export interface ControlProps {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

/** Label above a control, hint and problem below it. */
export function Field(props: {
  label: ReactNode;
  hint?: ReactNode;
  problem?: string | undefined;
  optional?: boolean;
  className?: string;
  children: (control: ControlProps, invalid: boolean) => ReactNode;
}) {
  const id = useId();
  const { hint, problem } = props;
  const described = [hint && `${id}-hint`, problem && `${id}-problem`].filter(Boolean).join(' ');
  const control: ControlProps = { id };
  if (described) control['aria-describedby'] = described;
  if (problem) control['aria-invalid'] = true;
  return (
    <div className={classNames('grid content-start gap-1', props.className)}>
      <label htmlFor={id} className="font-medium">
        {props.label}
        {props.optional && <span className="font-normal text-zinc-7"> (optional)</span>}
      </label>
      {props.children(control, problem !== undefined)}
      {hint && (
        <p id={`${id}-hint`} className="text-small text-zinc-7">
          {hint}
        </p>
      )}
      {problem && <ProblemText id={`${id}-problem`}>{problem}</ProblemText>}
    </div>
  );
}

/** The reason why a value is refused, beside its control. */
export function ProblemText({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p {...(id ? { id } : {})} className="text-small font-medium text-oxide" data-problem>
      {children}
    </p>
  );
}
