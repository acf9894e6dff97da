import { sectionName } from '#client/document/section-name.ts';
import { DeletedList } from '#client/ui/deleted-list.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';
import { useRestoreMember } from '../mutations.ts';

export function DeletedMembers({ calculation }: { calculation: Calculation }) {
  const restore = useRestoreMember(calculation.id);
  return (
    <DeletedList
      what="deleted member"
      deleted={calculation.deletedMembers.map(({ mark, section, ...rest }) => ({
        ...rest,
        name: mark,
        detail: sectionName(section),
      }))}
      restore={restore.mutate}
      restored={(mark) => `${mark} restored.`}
      className="mt-4"
    />
  );
}
