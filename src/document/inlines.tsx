import type { Inline } from '#shared/report/tree.ts';
import { useDocument } from './document-context.ts';
import { Formula } from './formula.tsx';

/** Runs of text, maths and values that lead to their lines. */
export function Inlines(props: {
  runs: readonly Inline[];
  /** Whether Tab comes to their values, on a sheet too. */
  inTabOrder?: boolean;
}) {
  const { runs, inTabOrder = false } = props;
  return runs.map((run, index) => (
    // biome-ignore lint/suspicious/noArrayIndexKey: runs of one text have no other identity
    <Run key={index} run={run} inTabOrder={inTabOrder} />
  ));
}

function Run({ run, inTabOrder }: { run: Inline; inTabOrder: boolean }) {
  switch (run.kind) {
    case 'text':
      if (run.strong) return <strong>{run.text}</strong>;
      return run.quiet ? <span className="text-zinc-7">{run.text}</span> : run.text;
    case 'math':
      return (
        <>
          <Formula tex={run.tex} />
          <span className="sr-only">{run.text}</span>
        </>
      );
    case 'value':
      return <ValueRun run={run} inTabOrder={inTabOrder} />;
  }
}

function ValueRun(props: { run: Extract<Inline, { kind: 'value' }>; inTabOrder: boolean }) {
  const { text, address, member } = props.run;
  const { follow, onCurrent } = useDocument();
  if (!follow) return <span className="figures font-semibold">{text}</span>;
  return (
    <button
      type="button"
      // Within lines the keyboard goes from line to line and from there to the sources.
      tabIndex={onCurrent && !props.inTabOrder ? -1 : 0}
      data-ref={address}
      className="figures cursor-pointer font-semibold"
      onClick={(event) => {
        event.stopPropagation();
        follow(address, member);
      }}
    >
      {text}
    </button>
  );
}
