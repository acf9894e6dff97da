import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { clause } from './writer.ts';

// Ranges of lateral-torsional buckling that F2.2, F4.2, F5.2 and F7.4 have in common.

/** A member's limits: null where no segment needs them. */
export interface LtbLimits {
  readonly Lp: Quantity | null;
  readonly Lr: Quantity | null;
}

export type LtbRange = 'continuous' | 'yielding' | 'inelastic' | 'elastic';

/** Where a clause's lines stand, and the equations that its outcomes name. */
export interface LtbClause {
  /** Prefix of the keys: `F2`. */
  readonly at: string;
  readonly clause: string;
  readonly limit: string;
  readonly inelastic: string;
  readonly elastic: string;
}

/**
 * Which range an unbraced length falls in, as a choice line; independent of Cb. `Lb` of zero says
 * that the compression flange is held continuously. Throws where a limit that the length needs was
 * not written.
 */
export function ltbRangeOf(
  r: Recorder,
  words: LtbClause,
  limits: LtbLimits,
  Lb: Quantity,
): LtbRange {
  const key = `${words.at}/LTB/range`;
  const title = 'Lateral-torsional buckling';
  if (Lb.value === 0) {
    r.choice(
      key,
      [
        {
          left: Lb,
          relation: '=',
          right: 0,
          outcome:
            'lateral-torsional buckling does not apply: the compression flange is held continuously',
        },
      ],
      '',
      { title, clause: clause(words.clause) },
    );
    return 'continuous';
  }
  const { Lp, Lr } = limits;
  if (!Lp) throw new Error(`${key}: Lp is not written`);
  const short = {
    left: Lb,
    relation: '<=',
    right: Lp,
    outcome: 'lateral-torsional buckling does not apply',
  } as const;
  if (Lb.value <= Lp.value) {
    r.choice(key, [short], 'lateral-torsional buckling is checked', {
      title,
      clause: clause(words.clause, words.limit),
    });
    return 'yielding';
  }
  if (!Lr) throw new Error(`${key}: Lr is not written`);
  const taken = r.choice(
    key,
    [
      short,
      {
        left: Lb,
        relation: '<=',
        right: Lr,
        outcome: `lateral-torsional buckling is inelastic: ${words.inelastic} applies`,
      },
    ],
    `lateral-torsional buckling is elastic: ${words.elastic} applies`,
    { title, clause: clause(words.clause) },
  );
  return taken === 1 ? 'inelastic' : 'elastic';
}
