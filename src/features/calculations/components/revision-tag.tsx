import { Tag } from '#client/ui/tag.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';

export const RevisionTag = ({ calculation }: { calculation: Calculation }) => (
  <Tag tone="ink">
    Rev {calculation.revision} · {calculation.state}
  </Tag>
);
