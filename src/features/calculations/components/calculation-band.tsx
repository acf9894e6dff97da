import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { count } from '#client/lib/count.ts';
import type { Calculation } from '#shared/contracts/calculations.ts';
import type { MemberRow } from '#shared/contracts/members.ts';
import { CAUTIONS_OF_COVER } from '#shared/report/cautions.ts';

/** Three things to know before the list: what is over, what is open, what is never covered. */
export function CalculationBand({ calculation }: { calculation: Calculation }) {
  const rows = calculation.memberRows;
  const asking = rows.filter(({ summary }) => summary.verdict !== 'OK');
  const open = rows.filter(({ summary }) => summary.unconfirmed > 0);
  const total = open.reduce((sum, { summary }) => sum + summary.unconfirmed, 0);
  return (
    <div className="grid grid-cols-3 border-b border-zinc-2">
      <Third title={attentionTitle(rows.length, asking.length)}>
        {asking.length === 0 &&
          (rows.length > 0
            ? 'Each is within its limits under every combination.'
            : 'Nothing has been calculated.')}
        {asking.slice(0, NAMED).map((row, index) => (
          <span key={row.id}>
            {index > 0 && '; '}
            <MemberLink calculation={calculation} row={row} /> {says(row)}
          </span>
        ))}
        {andMore(asking.length)}
      </Third>
      <Third title={`Not confirmed: ${total}`}>
        {total === 0 &&
          (rows.length > 0 ? 'Every input has a source and is confirmed.' : 'No inputs yet.')}
        {open.slice(0, NAMED).map((row, index) => (
          <span key={row.id}>
            {index > 0 && ', '}
            {count(row.summary.unconfirmed, 'input')} of{' '}
            <MemberLink calculation={calculation} row={row} />
          </span>
        ))}
        {andMore(open.length)}
      </Third>
      <Third title="Outside every sheet">{CAUTIONS_OF_COVER.at(-1)}</Third>
    </div>
  );
}

/** How many members a part names; the list below has all of them. */
const NAMED = 8;

const andMore = (all: number): string =>
  all > NAMED ? ` and ${count(all - NAMED, 'more member')}, in the list below` : '';

const attentionTitle = (members: number, asking: number): string => {
  if (members === 0) return 'No members yet';
  return asking > 0 ? `Wants attention: ${asking} of ${members}` : 'All members are OK';
};

const says = ({ summary }: MemberRow): string =>
  summary.problems.length > 0
    ? `has ${count(summary.problems.length, 'input')} to correct`
    : `${summary.verdict} ${summary.ratioText ?? ''}`.trim();

function MemberLink({ calculation, row }: { calculation: Calculation; row: MemberRow }) {
  return (
    <Link to={paths.member(calculation.id, row.id)} className="link whitespace-nowrap text-ink">
      {row.mark || 'without a mark'}
    </Link>
  );
}

function Third({ title, children }: { title: string; children: ReactNode }) {
  return (
    <div className="border-l border-zinc-2 px-5 py-4 first:border-l-0 first:pl-0 last:pr-0">
      <h2 className="font-semibold">{title}</h2>
      <p className="mt-0.5 text-zinc-7">{children}</p>
    </div>
  );
}
