import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import type { ProjectRow } from '#shared/contracts/projects.ts';

export function ProjectLedger({ rows }: { rows: readonly ProjectRow[] }) {
  return (
    <Ledger
      caption="Projects"
      head={
        <>
          <HeadCell>Number</HeadCell>
          <HeadCell>Project</HeadCell>
          <HeadCell>Client</HeadCell>
          <HeadCell>Place</HeadCell>
          <HeadCell className="text-right">Calculations</HeadCell>
          <HeadCell>Your role</HeadCell>
        </>
      }
    >
      {rows.map((row) => (
        <Row key={row.id}>
          <RowHead className="whitespace-nowrap">
            <Link to={paths.project(row.id)} className="link">
              {row.number}
            </Link>
          </RowHead>
          <Cell>{row.title}</Cell>
          <Cell>{row.client}</Cell>
          <Cell>{row.place}</Cell>
          <Cell className="figures text-right">{row.calculations}</Cell>
          <Cell>{row.roles.join(', ')}</Cell>
        </Row>
      ))}
    </Ledger>
  );
}
