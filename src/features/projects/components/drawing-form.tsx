import { useForm } from 'react-hook-form';
import { isProblem, reasonOf, refusalOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';
import { Field, fieldClass } from '#client/ui/field.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import { TextField } from '#client/ui/text-field.tsx';
import { type Drawing, drawingStatuses } from '#shared/contracts/projects.ts';
import { type DrawingValues, useCreateDrawing, useUpdateDrawing } from '../mutations.ts';

/** A row of the drawing register while it is written; of a new drawing without `drawing`. */
export function DrawingForm(props: { projectId: string; drawing?: Drawing; onDone: () => void }) {
  const { projectId, drawing, onDone } = props;
  const create = useCreateDrawing(projectId);
  const update = useUpdateDrawing(projectId);
  const error = create.error ?? update.error;
  const theirs = theirDrawing(error);
  const { register, handleSubmit, formState } = useForm<DrawingValues>({
    defaultValues: drawing
      ? {
          number: drawing.number,
          title: drawing.title,
          revision: drawing.revision,
          status: drawing.status,
        }
      : { number: '', title: '', revision: '', status: 'preliminary' },
  });
  const submit = handleSubmit((values) => {
    if (!drawing) return create.mutate(values, { onSuccess: onDone });
    const version = Math.max(drawing.version, theirs?.version ?? 0);
    update.mutate({ ...values, drawingId: drawing.id, version }, { onSuccess: onDone });
  });
  const { errors } = formState;
  return (
    <form
      noValidate
      onSubmit={submit}
      className="grid gap-3 border-b border-zinc-2 bg-zinc-1 px-3 py-3 font-sans"
    >
      {theirs && (
        <Failure title={`${theirs.changedBy} changed this drawing in the meantime`}>
          Now stored: {theirs.number} · {theirs.title} · revision {theirs.revision} ·{' '}
          {theirs.status}. Save again to put yours in its place, or cancel to keep it.
        </Failure>
      )}
      {error && !theirs && !refusalOf(error, 'number') && <Failure title={reasonOf(error)} />}
      <div className="grid grid-cols-[1.2fr_3fr_0.8fr_1.4fr] gap-3">
        <TextField
          label="Number"
          autoFocus
          problem={errors.number?.message ?? refusalOf(error, 'number')}
          {...register('number', { required: 'A drawing has a number' })}
        />
        <TextField label="Title" problem={errors.title?.message} {...register('title')} />
        <TextField label="Revision" problem={errors.revision?.message} {...register('revision')} />
        <Field label="Status">
          {(control, invalid) => (
            <select {...control} {...register('status')} className={fieldClass(invalid)}>
              {drawingStatuses.map((status) => (
                <option key={status}>{status}</option>
              ))}
            </select>
          )}
        </Field>
      </div>
      <div className="flex gap-2">
        <Button
          rank="main"
          size="small"
          type="submit"
          disabled={create.isPending || update.isPending}
        >
          {theirs ? 'Save mine' : 'Save'}
        </Button>
        <Button size="small" onClick={onDone}>
          Cancel
        </Button>
      </div>
    </form>
  );
}

const theirDrawing = (error: unknown): Drawing | undefined =>
  isProblem(error, 'conflict')
    ? (error.details?.conflict?.theirs as Drawing | undefined)
    : undefined;
