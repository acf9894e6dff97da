import { notGiven } from '#shared/contracts/draft-quantity.ts';
import type { DraftCombination } from '#shared/contracts/members.ts';
import { withAction, withCombination } from '../../edit-draft.ts';
import { withLoadsOf, withNewLoad, withoutShears, withSway } from '../../edit-loads.ts';
import { restraintsOf, runsOverPoints } from '../../edit-restraints.ts';
import { actionWords } from '../../member-fields.ts';
import { useMemberForm } from '../member-form-context.ts';
import { QuantityRow } from '../quantity-row.tsx';
import { LoadsPart } from './loads-part.tsx';
import { Part, type PartLink, PartLinks } from './part.tsx';
import { SupportsPart } from './supports-part.tsx';
import { SwayPart } from './sway-part.tsx';

/** What a combination may have beside its end forces. */
export function CombinationParts(props: {
  row: DraftCombination;
  units: 'us' | 'si';
  /** The basis takes sway by B2. */
  withSway: boolean;
}) {
  const { row, units } = props;
  const { draft } = useMemberForm();
  const at = `combinations[${draft.combinations.indexOf(row)}]`;
  const part = { row, at, units };
  return (
    <>
      <LoadsPart {...part} />
      <SupportsPart {...part} />
      <ShearsPart {...part} />
      <SwayPart {...part} />
      <CombinationPartLinks row={row} at={at} withSway={props.withSway} />
    </>
  );
}

function ShearsPart(props: { row: DraftCombination; at: string; units: 'us' | 'si' }) {
  const { row } = props;
  const { draft, edit } = useMemberForm();
  if (!row.Vx && !row.Vy) return null;
  return (
    <Part
      title="Shear from the analysis"
      onRemove={() => edit(withoutShears(draft, row.id), `${row.id}/shears/remove`)}
    >
      {(['Vx', 'Vy'] as const).map((name) => (
        <QuantityRow
          key={name}
          path={`${props.at}.${name}`}
          words={actionWords[name]}
          quantity={row[name] ?? notGiven}
          placeholder={props.units === 'us' ? 'kip' : 'kN'}
          onChange={(quantity) =>
            edit(withAction(draft, row.id, name, quantity), `${row.id}/${name}`)
          }
        />
      ))}
    </Part>
  );
}

function CombinationPartLinks(props: { row: DraftCombination; at: string; withSway: boolean }) {
  const { row, at } = props;
  const { draft, edit } = useMemberForm();
  const points = restraintsOf(draft);
  const alike = draft.combinations.findLast(({ id, loads }) => id !== row.id && loads?.length);
  const opened = (change: Partial<DraftCombination>) =>
    withCombination(draft, row.id, (was) => ({ ...was, ...change }));
  const links: (PartLink | false | undefined)[] = [
    !row.loads?.length && {
      text: 'loads between the ends',
      open: () => edit(withNewLoad(draft, row.id), `${row.id}/loads/open`),
      first: `${at}.loads[0].kind`,
    },
    !row.loads?.length &&
      alike && {
        text: `the loads of ${alike.name || alike.id}`,
        open: () => edit(withLoadsOf(draft, row.id, alike), `${row.id}/loads/same`),
        first: `${at}.loads[0].kind`,
      },
    points.length > 0 &&
      !row.supports &&
      !runsOverPoints(draft, row) && {
        text: 'moments over held points',
        open: () => edit(opened({ supports: [] }), `${row.id}/supports/open`),
        first: `${at}.supports[${points[0]?.id}].Mx`,
      },
    !row.Vx &&
      !row.Vy && {
        text: 'shear forces',
        open: () => edit(opened({ Vx: notGiven, Vy: notGiven }), `${row.id}/shears/open`),
        first: `${at}.Vx`,
      },
    props.withSway &&
      !row.sway && {
        text: 'sway',
        open: () => edit(withSway(draft, row.id, { P: notGiven }), `${row.id}/sway/open`),
        first: `${at}.sway.P`,
      },
  ];
  return (
    <PartLinks
      lead="It may also have"
      links={links.filter((link): link is PartLink => typeof link === 'object')}
    />
  );
}
