import { Formula } from '#client/document/formula.tsx';
import { classNames } from '#client/ui/class-names.ts';
import { SourceRing } from '#client/ui/source-ring.tsx';
import type { Trace, TraceStep } from '#shared/report/present-trace.ts';

/** From the operands down to the given values, which end it. */
export function Ladder(props: { trace: Trace; onFollow: (address: string) => void }) {
  const { sources, ladder } = props.trace;
  if (ladder.length === 0) {
    return <p className="text-small text-zinc-7">It comes from no other line: it is given.</p>;
  }
  const direct = new Set(sources.map(({ address }) => address));
  const below = ladder.filter(({ address }) => !direct.has(address));
  const computed = below.filter(({ given }) => !given);
  const given = below.filter((step) => step.given);
  const rungs = (steps: readonly TraceStep[]) =>
    steps.map((step) => (
      <li key={step.address}>
        <Rung step={step} onFollow={props.onFollow} />
      </li>
    ));
  return (
    <ol className="ladder" data-ladder aria-label="Down to the given values">
      {rungs(sources)}
      {rungs([...computed, ...given])}
    </ol>
  );
}

/** One line of the ladder: a ring, or a square where the ladder ends in a given value. */
export function Rung(props: {
  step: TraceStep;
  plain?: boolean;
  onFollow: (address: string) => void;
}) {
  const { step, plain } = props;
  const { given, result, working } = step;
  return (
    <button
      type="button"
      onClick={() => props.onFollow(step.address)}
      aria-label={`Line ${step.number}, ${step.text}${given ? `, given, ${given.source}` : ''}`}
      className={classNames('rung', given && 'is-given', plain && 'is-plain')}
    >
      <span className="rung-head">
        <span>
          {step.title}, {step.number}
        </span>
        <span className="figures font-semibold whitespace-nowrap">
          {result?.value} {result?.unit}
        </span>
      </span>
      {!given && !plain && working.length > 1 && (
        <span className="rung-working">
          {working.map((tex) => (
            <Formula key={tex} tex={tex} className="mr-1" />
          ))}
        </span>
      )}
      {given && (
        <span className="rung-source">
          <SourceRing letter={given.letter} confirmed={given.confirmed} /> {given.source} ·{' '}
          {given.confirmed ? 'confirmed' : <strong className="text-oxide">not confirmed</strong>}
        </span>
      )}
      {!given && working.length <= 1 && step.reference.clause && (
        <span className="rung-source">
          {step.reference.clause} {step.reference.equation}
        </span>
      )}
    </button>
  );
}
