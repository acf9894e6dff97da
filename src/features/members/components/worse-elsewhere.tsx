import { count } from '#client/lib/count.ts';
import { classNames } from '#client/ui/class-names.ts';
import { VERDICTS } from '#shared/calc/line.ts';
import type { CombinationRecord, MemberRecord } from '#shared/calc/record.ts';

/** Above the sheet of one combination that isn't the worst of its member: which one is. */
export function WorseElsewhere(props: {
  member: MemberRecord;
  shown: string | undefined;
  onShow: (combination: string) => void;
}) {
  const { combinations, mark } = props.member;
  const shown = combinations.find(({ id }) => id === props.shown);
  if (!shown) return null;
  const worse = combinations.filter((each) => isWorse(each, shown));
  const [worst] = worse.sort((a, b) => (isWorse(a, b) ? -1 : 1));
  if (!worst) return null;
  const { verdict, ratioText } = worst.summary;
  const graver = verdict !== shown.summary.verdict;
  return (
    <p
      className={classNames(
        'mx-auto mb-3 max-w-[880px] border-l-3 px-4 py-2',
        graver ? 'border-oxide bg-oxide-2' : 'border-zinc-5 bg-margin',
      )}
    >
      {mark} is{' '}
      <button
        type="button"
        className={classNames('link font-semibold', graver && 'text-oxide')}
        onClick={() => props.onShow(worst.id)}
      >
        {[verdict, ratioText].filter(Boolean).join(' ')} under {worst.name}
      </button>
      {worse.length > 1 &&
        `, and worse than here under ${count(worse.length - 1, 'more combination')}`}
      . This sheet shows {shown.name} only.
    </p>
  );
}

const rank = ({ summary }: CombinationRecord): number => VERDICTS.indexOf(summary.verdict);

const isWorse = (a: CombinationRecord, b: CombinationRecord): boolean =>
  rank(a) > rank(b) || (rank(a) === rank(b) && (a.summary.ratio ?? 0) > (b.summary.ratio ?? 0));
