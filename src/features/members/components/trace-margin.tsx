import type { ReactNode, RefObject } from 'react';
import { Button } from '#client/ui/button.tsx';
import { Keycap } from '#client/ui/keycap.tsx';
import type { Trace, TraceStep } from '#shared/report/present-trace.ts';
import { Ladder, Rung } from './ladder.tsx';

/** The way home of the chosen line, and what uses it, in the right margin. */
export function TraceMargin(props: {
  trace: Trace | null;
  /** The chosen line is not on this sheet. */
  lost: boolean;
  onFollow: (address: string) => void;
  onClose: () => void;
  onCopyLine: () => void;
  onCopyLink: () => void;
  /** What stands there while no line is chosen. */
  contents: ReactNode;
  container: RefObject<HTMLElement | null>;
}) {
  const { trace, lost, onFollow } = props;
  return (
    <aside
      ref={props.container}
      aria-label="Trace"
      data-screen-only
      className={`member-margin member-trace flex flex-col ${trace || lost ? '' : 'max-[1179px]:hidden'}`}
    >
      <div className="flex-1 px-5 py-5">
        {trace && (
          <>
            <div className="flex items-baseline justify-between gap-2">
              <h2 className="caps">Trace of line {trace.chosen.number}</h2>
              <Button size="small" rank="quiet" onClick={props.onClose}>
                Close
              </Button>
            </div>
            <ChosenStep trace={trace} />
            <div className="mt-1 mb-4 flex gap-2">
              <Button size="small" onClick={props.onCopyLine}>
                Copy line
              </Button>
              <Button size="small" onClick={props.onCopyLink}>
                Copy link
              </Button>
            </div>
            <Ladder trace={trace} onFollow={onFollow} />
            <UsedBy steps={trace.usedBy} onFollow={onFollow} />
          </>
        )}
        {lost && (
          <>
            <h2 className="caps">Trace</h2>
            <p className="mt-2">
              The line that was chosen is not on this sheet any more: with the present inputs it is
              not part of the calculation.
            </p>
            <Button size="small" className="mt-3" onClick={props.onClose}>
              Close
            </Button>
          </>
        )}
        {!trace && !lost && (
          <>
            <Invitation />
            {props.contents}
          </>
        )}
      </div>
      <TraceKeys />
    </aside>
  );
}

function ChosenStep({ trace }: { trace: Trace }) {
  const { title, result } = trace.chosen;
  return (
    <p className="mt-1 mb-2 flex items-baseline justify-between gap-3 border-b-2 border-oxide pb-1.5 font-semibold">
      <span>{title}</span>
      <span className="figures whitespace-nowrap">
        {result?.value} {result?.unit}
      </span>
    </p>
  );
}

function UsedBy(props: { steps: readonly TraceStep[]; onFollow: (address: string) => void }) {
  return (
    <section aria-labelledby="used-by" className="mt-6">
      <h3 id="used-by" className="caps mb-1">
        Used by
      </h3>
      {props.steps.length === 0 ? (
        <p className="text-small text-zinc-7">No line uses it: it is an end of the sheet.</p>
      ) : (
        <ul data-used-by>
          {props.steps.map((step) => (
            <li key={step.address}>
              <Rung step={step} plain onFollow={props.onFollow} />
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

const Invitation = () => (
  <>
    <h2 className="caps">Trace</h2>
    <p className="mt-2 font-serif text-zinc-7">
      Choose any number on the sheet: the values it came from light up in place, and here stands the
      way home, line by line, down to what was given and by whom.
    </p>
  </>
);

const keys: readonly (readonly [readonly string[], string])[] = [
  [['↑', '↓'], 'lines'],
  [['Enter'], 'trace'],
  [['s'], 'sources'],
  [['u'], 'used by'],
  [['c'], 'copy'],
  [['f'], 'fold'],
  [['⇧', 'F'], 'fold all'],
  [['Esc'], 'close'],
];

const TraceKeys = () => (
  <p className="sticky bottom-0 flex flex-wrap gap-x-3 gap-y-1 border-t border-zinc-2 bg-margin px-5 py-2.5 font-condensed text-small">
    {keys.map(([caps, does]) => (
      <span key={does} className="inline-flex items-center gap-1 whitespace-nowrap">
        {caps.map((cap) => (
          <Keycap key={cap}>{cap}</Keycap>
        ))}
        {does}
      </span>
    ))}
  </p>
);
