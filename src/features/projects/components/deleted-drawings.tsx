import { when } from '#client/lib/clock.ts';
import { count } from '#client/lib/count.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import type { Project } from '#shared/contracts/projects.ts';
import { useRestoreDrawing } from '../mutations.ts';

export function DeletedDrawings({ project }: { project: Project }) {
  const restore = useRestoreDrawing(project.id);
  const announce = useAnnounce();
  const { deletedDrawings } = project;
  if (deletedDrawings.length === 0) return null;
  return (
    <details className="mt-3 text-small text-zinc-7">
      <summary>{count(deletedDrawings.length, 'deleted drawing')}</summary>
      <ul className="mt-1">
        {deletedDrawings.map((drawing) => (
          <li key={drawing.id} className="flex items-baseline gap-3 py-1">
            <span className="text-ink">
              {drawing.number} {drawing.title}
            </span>
            <span>
              {when(drawing.deletedAt)}, {drawing.deletedBy}
            </span>
            <Button
              size="small"
              rank="quiet"
              aria-label={`Restore ${drawing.number}`}
              onClick={() =>
                restore.mutate(drawing.id, {
                  onSuccess: () => announce(`Drawing ${drawing.number} restored.`),
                  onError: (error) => announce(reasonOf(error)),
                })
              }
            >
              Restore
            </Button>
          </li>
        ))}
      </ul>
    </details>
  );
}
