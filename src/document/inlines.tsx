import type { Inline } from '#shared/report/tree.ts';
import { useDocument } from './document-context.ts';
import { Formula } from './formula.tsx';

/** Runs of text, maths and values that lead to their lines. */
export function Inlines({ runs }: { runs: readonly Inline[] }) {
  return runs.map((run, index) => (
    // biome-ignore lint/suspicious/noArrayIndexKey: runs of one text have no other identity
    <Run key={index} run={run} />
  ));
}

function Run({ run }: { run: Inline }) {
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
      return <ValueRun text={run.text} address={run.address} member={run.member} />;
  }
}

function ValueRun(props: { text: string; address: string; member: string | undefined }) {
  const { follow, onCurrent } = useDocument();
  if (!follow) return <span className="figures font-semibold">{props.text}</span>;
  return (
    <button
      type="button"
      // On a sheet the keyboard goes from line to line and from there to the sources.
      tabIndex={onCurrent ? -1 : 0}
      data-ref={props.address}
      className="figures cursor-pointer font-semibold"
      onClick={(event) => {
        event.stopPropagation();
        follow(props.address, props.member);
      }}
    >
      {props.text}
    </button>
  );
}
