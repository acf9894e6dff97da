import { InlineMath } from 'react-katex';

/** A fixed symbol for the eye, such as Lcx in a label; its spoken form stands beside it. */
export function SymbolMark({ tex }: { tex: string }) {
  return (
    <span aria-hidden="true">
      <InlineMath math={tex} />
    </span>
  );
}
