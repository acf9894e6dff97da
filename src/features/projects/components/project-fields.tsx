import type { FieldErrors, UseFormRegister } from 'react-hook-form';
import { refusalOf } from '#client/lib/problem.ts';
import { TextField } from '#client/ui/text-field.tsx';
import type { ProjectValues } from '../mutations.ts';

const longest = (max: number) => ({
  maxLength: { value: max, message: `At most ${max} characters` },
});

export function ProjectFields(props: {
  register: UseFormRegister<ProjectValues>;
  errors: FieldErrors<ProjectValues>;
  /** The error of the last attempt. */
  refusal: unknown;
}) {
  const { register, errors } = props;
  return (
    <div className="grid grid-cols-2 gap-4">
      <TextField
        label="Number"
        problem={errors.number?.message ?? refusalOf(props.refusal, 'number')}
        {...register('number', { required: 'A project has a number', ...longest(40) })}
      />
      <TextField
        label="Title"
        problem={errors.title?.message}
        {...register('title', { required: 'A project has a title', ...longest(160) })}
      />
      <TextField
        label="Client"
        optional
        problem={errors.client?.message}
        {...register('client', longest(160))}
      />
      <TextField
        label="Place"
        optional
        problem={errors.place?.message}
        {...register('place', longest(160))}
      />
    </div>
  );
}
