import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { Empty } from '#client/ui/state-panels.tsx';
import { splitAddress } from '#shared/calc/address.ts';
import type { Formula } from '#shared/calc/formula.ts';
import type { MemberUse } from '#shared/contracts/library.ts';
import { shortNameOf } from '#shared/library/show-formula.ts';

/** Members of one's calculations whose sheets use a clause, each line a link to it. */
export function ClauseUses(props: {
  formulas: readonly Formula[];
  members: readonly MemberUse[];
  total: number;
}) {
  const { members, total } = props;
  if (members.length === 0) {
    return <Empty>No member of your calculations uses this clause.</Empty>;
  }
  return (
    <>
      <Ledger
        caption="Members that use the clause"
        head={
          <>
            <HeadCell className="w-[18%]">Project</HeadCell>
            <HeadCell className="w-[22%]">Calculation</HeadCell>
            <HeadCell className="w-[9%]">Member</HeadCell>
            <HeadCell className="w-[12%]">Section</HeadCell>
            <HeadCell className="pr-0">Lines</HeadCell>
          </>
        }
      >
        {members.map((use) => (
          <UseRow key={use.member.id} use={use} formulas={props.formulas} />
        ))}
      </Ledger>
      {total > members.length && (
        <p className="mt-3 text-zinc-7">
          The first {members.length} of {total} members.
        </p>
      )}
    </>
  );
}

function UseRow({ use, formulas }: { use: MemberUse; formulas: readonly Formula[] }) {
  const { project, calculation, member } = use;
  return (
    <Row>
      <Cell className="text-zinc-7">
        {project.number} {project.title}
      </Cell>
      <Cell>
        <Link to={paths.calculation(calculation.id)} className="link">
          {calculation.number}
        </Link>{' '}
        {calculation.title}
      </Cell>
      <RowHead>
        <Link to={paths.member(calculation.id, member.id)} className="link">
          {member.mark || 'without a mark'}
        </Link>
      </RowHead>
      <Cell>{sectionName(member.section)}</Cell>
      <Cell className="pr-0">
        <ul className="flex flex-wrap gap-x-4">
          {use.uses.flatMap(({ formula: id, address, combinations }) => {
            const formula = formulas.find((one) => one.id === id);
            if (!formula) return [];
            const { combination } = splitAddress(address);
            const place = { combination: combination ?? undefined, line: address };
            return (
              <li key={id} className="whitespace-nowrap">
                <Link to={paths.member(calculation.id, member.id, place)} className="link">
                  {shortNameOf(formula)}
                  <span className="sr-only">
                    , {formula.title}, {member.mark}
                  </span>
                </Link>
                {combinations > 0 && (
                  <span className="text-zinc-7"> in {count(combinations, 'combination')}</span>
                )}
              </li>
            );
          })}
        </ul>
      </Cell>
    </Row>
  );
}
