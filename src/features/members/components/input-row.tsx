import type { ReactNode } from 'react';
import { ProblemText } from '#client/ui/field.tsx';
import { SymbolMark } from '#client/ui/symbol.tsx';
import { controlId, type FieldWords } from '../member-fields.ts';

export interface RowControl {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

/** One input of the margin: label at the left, control and its source at the right, problem below. */
export function InputRow(props: {
  path: string;
  label: ReactNode;
  problem: string | undefined;
  /** A word beside the label, such as what deletes the row. */
  beside?: ReactNode;
  /** The ring; left out, the control takes its room too. */
  source?: ReactNode;
  children: (control: RowControl) => ReactNode;
}) {
  const id = controlId(props.path);
  const control: RowControl = { id };
  if (props.problem) {
    control['aria-describedby'] = `${id}-problem`;
    control['aria-invalid'] = true;
  }
  return (
    <div className={props.source === undefined ? 'input-row is-wide' : 'input-row'}>
      {props.beside ? (
        <div className="flex min-w-0 items-baseline gap-2">
          <label htmlFor={id}>{props.label}</label>
          {props.beside}
        </div>
      ) : (
        <label htmlFor={id}>{props.label}</label>
      )}
      <div className="min-w-0">{props.children(control)}</div>
      {props.source !== undefined && (
        <div className="flex h-8 items-center justify-end">{props.source}</div>
      )}
      {props.problem && (
        <div className="col-span-full pb-1">
          <ProblemText id={`${id}-problem`}>{readable(props.problem)}</ProblemText>
        </div>
      )}
    </div>
  );
}

/** Problems follow a field's name in lists; beside the field they begin a sentence. */
export const readable = (problem: string): string => {
  const text = problem.charAt(0).toUpperCase() + problem.slice(1);
  return /[.!?)]$/.test(text) ? text : `${text}.`;
};

/** A field's name with its symbol, which is spoken in letters. */
export function SymbolLabel({ words }: { words: FieldWords }) {
  return (
    <>
      {words.label}
      {words.shown && (
        <>
          {' '}
          <SymbolMark tex={words.tex} />
        </>
      )}
      <span className="sr-only"> {words.spoken}</span>
    </>
  );
}
