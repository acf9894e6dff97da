import type { Verdict } from '#shared/calc/line.ts';
import { classNames } from './class-names.ts';

/** Always a word, and a figure where there is one: `OK 0.929`. */
export function VerdictText(props: { verdict: Verdict; ratioText: string | null }) {
  const bad = props.verdict !== 'OK';
  return (
    <span className={classNames('figures font-semibold whitespace-nowrap', bad && 'text-oxide')}>
      {props.verdict}
      {props.ratioText && ` ${props.ratioText}`}
    </span>
  );
}
