import { count } from '#client/lib/count.ts';
import { VERDICTS } from '#shared/calc/line.ts';
import type { MemberRecord } from '#shared/calc/record.ts';

/** Above the sheet of one combination: under which others the verdict is a worse one. */
export function WorseElsewhere(props: {
  member: MemberRecord;
  shown: string | undefined;
  onShow: (combination: string) => void;
}) {
  const { combinations, mark } = props.member;
  const shown = combinations.find(({ id }) => id === props.shown);
  if (!shown) return null;
  const rank = (of: typeof shown) => VERDICTS.indexOf(of.summary.verdict);
  const worse = combinations
    .filter((each) => rank(each) > rank(shown))
    .sort((a, b) => rank(b) - rank(a));
  const [worst] = worse;
  if (!worst) return null;
  return (
    <p className="mx-auto mb-3 max-w-[880px] border-l-3 border-oxide bg-oxide-2 px-4 py-2">
      {mark} is{' '}
      <button
        type="button"
        className="link font-semibold text-oxide"
        onClick={() => props.onShow(worst.id)}
      >
        {worst.summary.verdict} under {worst.name}
      </button>
      {worse.length > 1 &&
        `, and worse than here under ${count(worse.length - 1, 'more combination')}`}
      . This sheet shows {shown.name} only.
    </p>
  );
}
