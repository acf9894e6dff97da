import type { Clause } from '../calc/line.ts';

/** A line's reference at the left of a sheet: `E3`, `E3-2`; `App. 8`, `A-8-3`; `theory 1.1`. */
export function referenceOf(clause: Clause | null): { clause: string; equation: string } {
  if (clause === null) return { clause: '', equation: '' };
  return { clause: clauseText(clause), equation: clause.equation ?? '' };
}

export const clauseText = ({ book, clause }: Clause): string => {
  const name = clause.replace(/^Appendix /, 'App. ');
  return book === 'elastic-theory' && !name.startsWith('theory') ? `theory ${name}` : name;
};

/** `H1-1a`, or the clause where the equation has no number. */
export const shortReference = (clause: Clause): string => clause.equation ?? clauseText(clause);
