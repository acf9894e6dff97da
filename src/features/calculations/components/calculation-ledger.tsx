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
          <HeadCell className="w-[20%]">Largest ratio</HeadCell>
          <HeadCell>Verdict</HeadCell>
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
          <Cell>
            {row.ratio !== null && (
              <span className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-2.5">
                <RatioBar ratio={row.ratio} />
                <span className="figures">{row.ratioText}</span>
              </span>
            )}
          </Cell>
          <Cell>
            {row.verdict ? (
              <VerdictText verdict={row.verdict} ratioText={null} />
            ) : (
              <span className="whitespace-nowrap text-zinc-7">no members</span>
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
