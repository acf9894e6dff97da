import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import type { MemberRow } from '#shared/contracts/members.ts';

/** The members before and after this one. */
export function Neighbours(props: {
  calculationId: string;
  rows: readonly MemberRow[];
  memberId: string;
}) {
  const at = props.rows.findIndex(({ id }) => id === props.memberId);
  const around = [
    { row: props.rows[at - 1], arrow: '←', side: 'before' },
    { row: props.rows[at + 1], arrow: '→', side: 'after' },
  ] as const;
  return around.map(
    ({ row, arrow, side }) =>
      row && (
        <Link key={side} to={paths.member(props.calculationId, row.id)} className="link">
          <span aria-hidden="true">{arrow} </span>
          {row.mark || 'without a mark'}
          <span className="sr-only">, the member {side}</span>
        </Link>
      ),
  );
}
