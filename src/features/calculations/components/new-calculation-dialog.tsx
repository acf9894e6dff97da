import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { reasonOf, refusalOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';
import { Dialog } from '#client/ui/dialog.tsx';
import { Field, fieldClass } from '#client/ui/field.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import { TextField } from '#client/ui/text-field.tsx';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import type { Project } from '#shared/contracts/projects.ts';
import { designWords, firstBasis, unitWords } from '../basis-words.ts';
import { useCreateCalculation } from '../mutations.ts';

interface Values {
  number: string;
  title: string;
  design: BasisDraft['design'];
  units: BasisDraft['units'];
}

export function NewCalculationDialog(props: { project: Project; onClose: () => void }) {
  const create = useCreateCalculation(props.project.id);
  const navigate = useNavigate();
  const { register, handleSubmit, formState } = useForm<Values>({
    defaultValues: { number: '', title: '', design: 'LRFD', units: 'us' },
  });
  const { errors } = formState;
  const submit = handleSubmit(({ number, title, design, units }) =>
    create.mutate(
      { number, title, basis: { ...firstBasis, design, units, constants: units } },
      { onSuccess: ({ id }) => navigate(paths.basis(id)) },
    ),
  );
  return (
    <Dialog title="A new calculation" onClose={props.onClose}>
      <form noValidate onSubmit={submit} className="grid gap-4">
        {create.error && !refusalOf(create.error, 'number') && (
          <Failure title={reasonOf(create.error)} />
        )}
        <div className="grid grid-cols-2 gap-4">
          <TextField
            label="Number"
            problem={errors.number?.message ?? refusalOf(create.error, 'number')}
            {...register('number', { required: 'A calculation has a number' })}
          />
          <TextField
            label="Title"
            problem={errors.title?.message}
            {...register('title', { required: 'A calculation has a title' })}
          />
          <Field label="Design">
            {(control, invalid) => (
              <select {...control} {...register('design')} className={fieldClass(invalid)}>
                {designWords.map(({ value, text }) => (
                  <option key={value} value={value}>
                    {text}
                  </option>
                ))}
              </select>
            )}
          </Field>
          <Field label="Units">
            {(control, invalid) => (
              <select {...control} {...register('units')} className={fieldClass(invalid)}>
                {unitWords.map(({ value, text }) => (
                  <option key={value} value={value}>
                    {text}
                  </option>
                ))}
              </select>
            )}
          </Field>
        </div>
        <p className="text-small text-zinc-7">
          To ANSI/AISC 360-22. The rest of the basis of design is set on the next page.
        </p>
        <div className="flex justify-end gap-2">
          <Button onClick={props.onClose}>Cancel</Button>
          <Button rank="main" type="submit" disabled={create.isPending}>
            Begin the calculation
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
