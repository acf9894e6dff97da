import { VERDICTS, type Verdict } from './line.ts';

/** The worst of some verdicts; FAILED > NOT OK > NOT CHECKED > OK. Nothing checked is NOT CHECKED. */
export const worstVerdict = (verdicts: readonly Verdict[]): Verdict =>
  verdicts.length === 0
    ? 'NOT CHECKED'
    : verdicts.reduce((a, b) => (VERDICTS.indexOf(b) > VERDICTS.indexOf(a) ? b : a));
