import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { classNames } from '#client/ui/class-names.ts';
import { Cell, Row, RowHead } from '#client/ui/ledger.tsx';
import { RatioBar } from '#client/ui/ratio-bar.tsx';
import { Tag } from '#client/ui/tag.tsx';
import { VerdictText } from '#client/ui/verdict.tsx';
import type { MemberRow } from '#shared/contracts/members.ts';
import type { Selection } from '../bulk-selection.ts';
import { SelectBox } from './bulk-select.tsx';
import { MemberRowActions } from './member-row-actions.tsx';

export function MemberLedgerRow(props: {
  calculationId: string;
  row: MemberRow;
  onMove?: (by: -1 | 1) => void;
  selection?: Selection;
}) {
  const { calculationId, row, onMove, selection } = props;
  const { summary } = row;
  const { governing } = summary;
  return (
    <Row className={classNames(selection?.has(row.id) && 'bg-zinc-1')}>
      {selection && (
        <Cell className="align-middle select-none">
          <SelectBox selection={selection} id={row.id} mark={row.mark} />
        </Cell>
      )}
      <RowHead className="whitespace-nowrap">
        <Link to={paths.member(calculationId, row.id)} className="link">
          {row.mark || 'without a mark'}
        </Link>
      </RowHead>
      <Cell className="whitespace-nowrap">{sectionName(row.section) || '–'}</Cell>
      <Cell>{[row.place, row.length].filter(Boolean).join(', ')}</Cell>
      <Cell className="align-middle">
        <RatioBar ratio={summary.ratio} />
      </Cell>
      <Cell className="text-right">
        <VerdictText verdict={summary.verdict} ratioText={summary.ratioText} />
      </Cell>
      <Cell>
        {governing &&
          [governing.clause.equation ?? governing.clause.clause, governing.combinationName]
            .filter(Boolean)
            .join(', ')}
      </Cell>
      <Cell>
        <MemberState row={row} />
      </Cell>
      {onMove && (
        <Cell className="py-1 pr-0 whitespace-nowrap">
          <MemberRowActions calculationId={calculationId} row={row} onMove={onMove} />
        </Cell>
      )}
    </Row>
  );
}

/** What a member asks for beside its verdict; one doesn't hide another. */
function MemberState({ row }: { row: MemberRow }) {
  const { problems, unconfirmed } = row.summary;
  if (problems.length === 0 && unconfirmed === 0)
    return <span className="text-zinc-7">confirmed</span>;
  return (
    <span className="flex flex-wrap gap-1">
      {problems.length > 0 && <Tag tone="asks">{count(problems.length, 'input')} to correct</Tag>}
      {unconfirmed > 0 && <Tag>{unconfirmed} not confirmed</Tag>}
    </span>
  );
}
