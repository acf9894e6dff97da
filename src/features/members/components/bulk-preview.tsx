import { sectionName } from '#client/document/section-name.ts';
import { count } from '#client/lib/count.ts';
import { Button } from '#client/ui/button.tsx';
import { Cell, HeadCell, Ledger, Row, RowHead } from '#client/ui/ledger.tsx';
import { VerdictText } from '#client/ui/verdict.tsx';
import type { PlannedChange } from '../bulk-plan.ts';
import type { MemberVerdict } from '../member-verdict.ts';
import { placeWords } from '../place-words.ts';
import { readable } from './input-row.tsx';

/** Each member that is to be changed: what moves, and its verdict before and after. */
export function BulkPreview(props: {
  rows: readonly PlannedChange[];
  verdicts: ReadonlyMap<string, MemberVerdict>;
  onLeaveOut: (id: string) => void;
}) {
  const { rows, verdicts } = props;
  return (
    <Ledger
      caption="What changes in each member"
      head={
        <>
          <HeadCell>Member</HeadCell>
          <HeadCell className="w-[42%]">Change</HeadCell>
          <HeadCell className="text-right">Verdict now</HeadCell>
          <HeadCell className="text-right">after</HeadCell>
          <HeadCell className="w-[1%]">
            <span className="sr-only">Leave out</span>
          </HeadCell>
        </>
      }
    >
      {rows.map((row) => {
        const { member, changes, remarks } = row;
        const mark = member.draft.mark || 'without a mark';
        const { verdict, ratioText } = member.summary;
        return (
          <Row key={member.id}>
            <RowHead className="whitespace-nowrap">{mark}</RowHead>
            <Cell>
              {row.isNone ? (
                <span className="text-zinc-7">stays as it is</span>
              ) : (
                changes.map(({ label, before, after }) => (
                  <p key={label}>
                    {label}:{' '}
                    <del className="text-zinc-7 no-underline">
                      {sectionName(before) || 'not given'}
                    </del>{' '}
                    <span aria-hidden="true">→ </span>
                    <ins className="font-medium no-underline">
                      {sectionName(after) || 'not given'}
                    </ins>
                  </p>
                ))
              )}
              {remarks.map((text) => (
                <p key={text} className="text-small text-oxide">
                  {text}
                </p>
              ))}
              <Problems verdict={verdicts.get(member.id)} />
            </Cell>
            <Cell className="text-right">
              <VerdictText verdict={verdict} ratioText={ratioText} />
            </Cell>
            <Cell className="text-right">
              <After row={row} verdict={verdicts.get(member.id)} />
            </Cell>
            <Cell className="py-1 pr-0">
              <Button
                size="small"
                rank="quiet"
                aria-label={`Leave out ${mark}`}
                onClick={() => props.onLeaveOut(member.id)}
              >
                Leave out
              </Button>
            </Cell>
          </Row>
        );
      })}
    </Ledger>
  );
}

function After({ row, verdict }: { row: PlannedChange; verdict: MemberVerdict | undefined }) {
  if (row.isNone) return <span className="text-zinc-7">–</span>;
  if (!verdict) return <span className="text-small text-zinc-7">running …</span>;
  if (!verdict.ok) return <VerdictText verdict="NOT CHECKED" ratioText={null} />;
  return <VerdictText verdict={verdict.summary.verdict} ratioText={verdict.summary.ratioText} />;
}

const shown = 3;

function Problems({ verdict }: { verdict: MemberVerdict | undefined }) {
  if (!verdict || verdict.ok) return null;
  const { problems } = verdict;
  return (
    <ul className="text-small text-oxide">
      {problems.slice(0, shown).map(({ path, message }) => (
        <li key={path}>
          {placeWords(path)}: {readable(message)}
        </li>
      ))}
      {problems.length > shown && <li>and {count(problems.length - shown, 'more input')}</li>}
    </ul>
  );
}
