import { paths } from '#client/app/paths.ts';
import type { Crumb, Tab } from '#client/app/top-bar.tsx';
import type { Calculation } from '#shared/contracts/calculations.ts';

/** The parts of a calculation, in the top bar; a member's page is one of the members. */
export const calculationTabs = (calculationId: string, onMember = false): readonly Tab[] => [
  { text: 'Basis', to: paths.basis(calculationId) },
  { text: 'Members', to: paths.calculation(calculationId), end: true, current: onMember },
  { text: 'Report', to: paths.report(calculationId) },
];

/** Where a calculation stands; its project is a link only for those who may open it. */
export const calculationCrumbs = (calculation: Calculation | undefined): readonly Crumb[] =>
  calculation
    ? [
        {
          text: calculation.project.title,
          to: calculation.projectVisible ? paths.project(calculation.project.id) : undefined,
        },
        {
          text: `${calculation.number} ${calculation.title}`,
          to: paths.calculation(calculation.id),
        },
      ]
    : [{ text: 'Calculation' }];
