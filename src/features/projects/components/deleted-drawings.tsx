import { DeletedList } from '#client/ui/deleted-list.tsx';
import type { Project } from '#shared/contracts/projects.ts';
import { useRestoreDrawing } from '../mutations.ts';

export function DeletedDrawings({ project }: { project: Project }) {
  const restore = useRestoreDrawing(project.id);
  return (
    <DeletedList
      what="deleted drawing"
      deleted={project.deletedDrawings.map(({ number, title, ...rest }) => ({
        ...rest,
        name: number,
        detail: title,
      }))}
      restore={restore.mutate}
      restored={(number) => `Drawing ${number} restored.`}
      className="mt-3"
    />
  );
}
