import type { ComponentProps, ReactNode } from 'react';
import { Field, fieldClass } from './field.tsx';

interface Around {
  label: ReactNode;
  hint?: ReactNode;
  problem?: string | undefined;
  optional?: boolean;
  fieldClassName?: string;
}

export function TextField({
  label,
  hint,
  problem,
  optional,
  fieldClassName,
  ...rest
}: Around & ComponentProps<'input'>) {
  return (
    <Field {...around(label, hint, problem, optional, fieldClassName)}>
      {(control, invalid) => (
        <input {...control} {...rest} className={fieldClass(invalid, rest.className)} />
      )}
    </Field>
  );
}

export function TextArea({
  label,
  hint,
  problem,
  optional,
  fieldClassName,
  ...rest
}: Around & ComponentProps<'textarea'>) {
  return (
    <Field {...around(label, hint, problem, optional, fieldClassName)}>
      {(control, invalid) => (
        <textarea
          rows={4}
          {...control}
          {...rest}
          className={fieldClass(invalid, 'h-auto py-1.5')}
        />
      )}
    </Field>
  );
}

export function SelectField<T extends string>(
  props: Around & {
    value: T;
    options: readonly { value: T; text: string }[];
    onValue: (value: T) => void;
    disabled?: boolean;
  },
) {
  return (
    <Field
      {...around(props.label, props.hint, props.problem, props.optional, props.fieldClassName)}
    >
      {(control, invalid) => (
        <select
          {...control}
          disabled={props.disabled}
          value={props.value}
          onChange={(event) => props.onValue(event.target.value as T)}
          className={fieldClass(invalid)}
        >
          {props.options.map(({ value, text }) => (
            <option key={value} value={value}>
              {text}
            </option>
          ))}
        </select>
      )}
    </Field>
  );
}

const around = (
  label: ReactNode,
  hint: ReactNode,
  problem: string | undefined,
  optional: boolean | undefined,
  className: string | undefined,
) => ({
  label,
  hint,
  problem,
  ...(optional ? { optional } : {}),
  ...(className ? { className } : {}),
});
