import { notGiven } from '#shared/contracts/draft-quantity.ts';
import { noJoints, noNetSection, noSizes, withChart } from '../../edit-parts.ts';
import { withNewRestraint } from '../../edit-restraints.ts';
import { useMemberForm } from '../member-form-context.ts';
import { type PartLink, PartLinks } from './part.tsx';

/** The parts that this member does not have yet. */
export function MemberPartLinks() {
  const { draft, edit } = useMemberForm();
  const links: (PartLink | false)[] = [
    draft.restraints === undefined && {
      text: 'held points',
      open: () => edit(withNewRestraint(draft), 'restraints/open'),
      first: 'restraints[0].at',
    },
    draft.charts === undefined && {
      text: 'joints by alignment chart',
      open: () => edit(withChart(draft, 'x', noJoints), 'charts/open'),
      first: 'charts.x.sidesway',
    },
    draft.netSection === undefined && {
      text: 'a net section',
      open: () => edit({ ...draft, netSection: noNetSection }, 'netSection/open'),
      first: 'netSection.by',
    },
    draft.sizes === undefined && {
      text: 'sizes of its own',
      open: () => edit({ ...draft, sizes: noSizes }, 'sizes/open'),
      first: 'section.d',
    },
    draft.stiffeners === undefined && {
      text: 'web stiffeners',
      open: () => edit({ ...draft, stiffeners: notGiven }, 'stiffeners/open'),
      first: 'stiffeners',
    },
  ];
  return <PartLinks lead="It may also have" links={links.filter((link) => link !== false)} />;
}
