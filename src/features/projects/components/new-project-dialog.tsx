import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { reasonOf, refusalOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';
import { Dialog } from '#client/ui/dialog.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import { type ProjectValues, useCreateProject } from '../mutations.ts';
import { ProjectFields } from './project-fields.tsx';

export function NewProjectDialog({ onClose }: { onClose: () => void }) {
  const create = useCreateProject();
  const navigate = useNavigate();
  const { register, handleSubmit, formState } = useForm<ProjectValues>({
    defaultValues: { number: '', title: '', client: '', place: '' },
  });
  const submit = handleSubmit((values) =>
    create.mutate(values, { onSuccess: ({ id }) => navigate(paths.project(id)) }),
  );
  return (
    <Dialog title="A new project" onClose={onClose}>
      <form noValidate onSubmit={submit} className="grid gap-4">
        {create.error && !refusalOf(create.error, 'number') && (
          <Failure title={reasonOf(create.error)} />
        )}
        <ProjectFields register={register} errors={formState.errors} refusal={create.error} />
        <div className="flex justify-end gap-2">
          <Button onClick={onClose}>Cancel</Button>
          <Button rank="main" type="submit" disabled={create.isPending}>
            Open the project
          </Button>
        </div>
      </form>
    </Dialog>
  );
}
