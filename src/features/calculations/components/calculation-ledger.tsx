import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { when } from '#client/lib/clock.ts';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { RatioBar } from '#client/ui/ratio-bar.tsx';
import { VerdictText } from '#client/ui/verdict.tsx';
import type { CalculationRow } from '#shared/contracts/calculations.ts';

/** Calculations with their worst member; the project's column only where they are of several. */
export function CalculationLedger(props: {
  rows: readonly CalculationRow[];
  showProject?: boolean;
  caption: string;
}) {
  return (
    <Ledger
      caption={props.caption}
      head={
        <>
          <HeadCell>Number</HeadCell>
          <HeadCell>Title</HeadCell>
          {props.showProject && <HeadCell>Project</HeadCell>}
          <HeadCell>Rev</HeadCell>
          <HeadCell className="text-right">Members</HeadCell>
          <HeadCell className="w-[16%]">Worst</HeadCell>
          <HeadCell className="text-right">Verdict</HeadCell>
          <HeadCell className="text-right">Not confirmed</HeadCell>
          <HeadCell>Changed</HeadCell>
        </>
      }
    >
      {props.rows.map((row) => (
        <Row key={row.id}>
          <RowHead className="whitespace-nowrap">
            <Link to={paths.calculation(row.id)} className="link">
              {row.number}
            </Link>
          </RowHead>
          <Cell>{row.title}</Cell>
          {props.showProject && <Cell>{row.project.title}</Cell>}
          <Cell className="whitespace-nowrap">
            {row.revision}, {row.state}
          </Cell>
          <Cell className="figures text-right">{row.members}</Cell>
          <Cell className="align-middle">
            <RatioBar ratio={row.ratio} />
          </Cell>
          <Cell className="text-right">
            {row.verdict ? (
              <VerdictText verdict={row.verdict} ratioText={row.ratioText} />
            ) : (
              'no members'
            )}
          </Cell>
          <Cell className="figures text-right">{row.unconfirmed}</Cell>
          <Cell className="whitespace-nowrap text-zinc-7">
            {when(row.changedAt)}, {row.changedBy}
          </Cell>
        </Row>
      ))}
    </Ledger>
  );
}
