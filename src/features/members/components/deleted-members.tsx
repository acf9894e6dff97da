import { sectionName } from '#client/document/section-name.ts';
import { when } from '#client/lib/clock.ts';
import { count } from '#client/lib/count.ts';
import { reasonOf } from '#client/lib/problem.ts';
import { useAnnounce } from '#client/ui/announcements.tsx';
import { Button } from '#client/ui/button.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { useRestoreMember } from '../mutations.ts';

export function DeletedMembers({ calculation }: { calculation: Calculation }) {
  const restore = useRestoreMember(calculation.id);
  const announce = useAnnounce();
  const { deletedMembers } = calculation;
  if (deletedMembers.length === 0) return null;
  return (
    <details className="mt-4 text-small text-zinc-7">
      <summary>{count(deletedMembers.length, 'deleted member')}</summary>
      <ul className="mt-1">
        {deletedMembers.map((member) => (
          <li key={member.id} className="flex items-baseline gap-3 py-1">
            <span className="text-ink">
              {member.mark} {sectionName(member.section)}
            </span>
            <span>
              {when(member.deletedAt)}, {member.deletedBy}
            </span>
            <Button
              size="small"
              rank="quiet"
              aria-label={`Restore ${member.mark}`}
              onClick={() =>
                restore.mutate(member.id, {
                  onSuccess: () => announce(`${member.mark} restored.`),
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
