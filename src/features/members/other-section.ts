import type { DraftChart } from '#shared/contracts/draft-parts.ts';
import type { DraftQuantity } from '#shared/contracts/draft-quantity.ts';
import { sectionTextOf } from '#shared/contracts/draft-section.ts';
import {
  actionNames,
  actionOf,
  type DraftCombination,
  type MemberDraft,
} from '#shared/contracts/members.ts';
import { normalDesignation } from '#shared/sections/table.ts';
import { withForcesOf } from './edit-draft.ts';

const isGiven = ({ text }: DraftQuantity): boolean => text.trim() !== '';
const open = (quantity: DraftQuantity): DraftQuantity => ({ ...quantity, confirmed: false });
const openJoints = (chart: DraftChart): DraftChart => ({
  ...{ ...chart, GA: open(chart.GA), GB: open(chart.GB) },
});

/** Whether anything of an analysis is given in a combination. */
export const hasForces = (row: DraftCombination): boolean =>
  actionNames.some((action) => isGiven(actionOf(row, action))) ||
  Boolean(row.loads?.length || row.supports?.length || row.sway);

/**
 * A member with a rolled section in place of what it has. Its forces stay, marked as those of the
 * section they were analysed with; its net section and the stiffness ratios of its joints, which
 * were those of the section before, are not confirmed any more.
 */
export function withOtherSection(draft: MemberDraft, section: DraftQuantity): MemberDraft {
  const was = sectionTextOf(draft);
  const { sizes: _, netSection, charts, ...rest } = draft;
  return {
    ...rest,
    section,
    ...(netSection
      ? {
          netSection: {
            ...{ ...netSection, Ae: open(netSection.Ae), An: open(netSection.An) },
            U: open(netSection.U),
          },
        }
      : {}),
    ...(charts
      ? {
          charts: {
            ...(charts.x ? { x: openJoints(charts.x) } : {}),
            ...(charts.y ? { y: openJoints(charts.y) } : {}),
          },
        }
      : {}),
    combinations: draft.combinations.map((row) => (hasForces(row) ? withForcesOf(was, row) : row)),
  };
}

/** What the forces were analysed with, and how many combinations have any. */
export function analysedForces(draft: MemberDraft): {
  readonly combinations: number;
  readonly sections: readonly string[];
} {
  const rows = draft.combinations.filter(hasForces);
  const sections = rows.map((row) => row.analysedWith?.trim() || sectionTextOf(draft));
  return {
    combinations: rows.length,
    sections: [...new Set(sections.filter((name) => name !== '').map(normalDesignation))],
  };
}
