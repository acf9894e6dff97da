import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { isProblem, reasonOf } from '#client/lib/problem.ts';
import { Button } from '#client/ui/button.tsx';
import { Failure } from '#client/ui/state-panels.tsx';
import type { Project } from '#shared/contracts/projects.ts';
import { type ProjectValues, useUpdateProject } from '../mutations.ts';
import { ProjectFields } from './project-fields.tsx';

/** Number, title, client, place and who works on it; the engineer may change the first four. */
export function ProjectFacts({ project }: { project: Project }) {
  const [editing, setEditing] = useState(false);
  if (editing) return <ProjectForm project={project} onDone={() => setEditing(false)} />;
  const facts: readonly (readonly [string, string])[] = [
    ['Client', project.client],
    ['Place', project.place],
    ['Office', project.firm],
    ['Your role', project.roles.join(', ')],
    ['Team', project.team.map(({ name, roles }) => `${name} (${roles.join(', ')})`).join('; ')],
  ];
  return (
    <div className="flex items-start justify-between gap-6 border-b border-zinc-2 py-4">
      <dl className="grid flex-1 grid-cols-[repeat(4,minmax(0,1fr))] gap-x-6 gap-y-3">
        {facts.map(([label, value]) => (
          <div key={label} className={label === 'Team' ? 'col-span-4' : ''}>
            <dt className="font-condensed text-small text-zinc-7">{label}</dt>
            <dd className="font-medium">{value || 'not given'}</dd>
          </div>
        ))}
      </dl>
      {project.can.edit && (
        <Button size="small" onClick={() => setEditing(true)}>
          Change
        </Button>
      )}
    </div>
  );
}

function ProjectForm({ project, onDone }: { project: Project; onDone: () => void }) {
  const update = useUpdateProject(project.id);
  const { number, title, client, place } = project;
  const { register, handleSubmit, formState } = useForm<ProjectValues>({
    defaultValues: { number, title, client, place },
  });
  const save = handleSubmit((values) =>
    update.mutate(
      { ...values, version: versionToSave(project, update.error) },
      { onSuccess: onDone },
    ),
  );
  const conflict = isProblem(update.error, 'conflict') ? update.error.details?.conflict : undefined;
  return (
    <form noValidate onSubmit={save} className="grid gap-4 border-b border-zinc-2 py-4">
      {conflict ? (
        <Failure title={`${conflict.changedBy} changed these facts in the meantime`}>
          {theirText(conflict.theirs)} Save again to put yours in their place, or cancel to keep
          theirs.
        </Failure>
      ) : (
        update.error && <Failure title={reasonOf(update.error)} />
      )}
      <ProjectFields register={register} errors={formState.errors} refusal={update.error} />
      <div className="flex gap-2">
        <Button rank="main" type="submit" disabled={update.isPending}>
          {conflict ? 'Save mine' : 'Save'}
        </Button>
        <Button onClick={onDone}>Cancel</Button>
      </div>
    </form>
  );
}

const theirs = (error: unknown): Project | undefined =>
  isProblem(error, 'conflict')
    ? (error.details?.conflict?.theirs as Project | undefined)
    : undefined;

const versionToSave = (project: Project, error: unknown): number =>
  Math.max(project.version, theirs(error)?.version ?? 0);

const theirText = (value: unknown): string => {
  const { number, title, client, place } = value as Project;
  return `Now stored: ${[number, title, client, place].filter(Boolean).join(' · ')}.`;
};
