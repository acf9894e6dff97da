import { useEffect, useRef } from 'react';
import { Formula as FormulaMark } from '#client/document/formula.tsx';
import { classNames } from '#client/ui/class-names.ts';
import type { Formula } from '#shared/calc/formula.ts';
import { showFormula } from '#shared/library/show-formula.ts';

/** A formula of a clause as a line of a sheet; the one that the address names is chosen. */
export function FormulaLine({ formula, chosen }: { formula: Formula; chosen: boolean }) {
  const line = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (!chosen) return;
    line.current?.focus({ preventScroll: true });
    line.current?.scrollIntoView({ block: 'nearest' });
  }, [chosen]);
  const { id, equation, title, validity } = formula;
  const { tex, text } = showFormula(formula);
  return (
    // biome-ignore lint/a11y/useSemanticElements: a line is a group of what stands in its columns
    <div
      ref={line}
      role="group"
      tabIndex={-1}
      aria-label={`${equation ?? 'Without a number'}, ${title}: ${text}`}
      {...(chosen ? { 'aria-current': true as const } : {})}
      data-formula={id}
      className={classNames('sheet-line', chosen && 'is-chosen')}
    >
      <div className="line-reference">
        <span className={equation ? 'line-number' : 'text-zinc-7'}>{equation ?? 'no number'}</span>
      </div>
      <p className="line-title">{title}</p>
      <div className="line-working">
        <FormulaMark tex={tex} className="line-step" />
        <span className="sr-only">{text}</span>
      </div>
      {validity && (
        <p className="line-words">
          <strong>Holds</strong> {validity}.
        </p>
      )}
    </div>
  );
}
