import type { Source } from '../calc/line.ts';
import type { GivenValue } from '../calc/quantity.ts';
import type { WShape } from '../sections/table.ts';
import type { CalculationInput, Ends } from './input.ts';
import type { Steel } from './material.ts';

/** What is wrong with an input, where, and what would be right. */
export interface Problem {
  /** `members[0].combinations[1].P`. */
  readonly path: string;
  readonly message: string;
}

export interface Stated<T> {
  readonly value: T;
  readonly source: Source;
  readonly confirmed: boolean;
}

export interface ResolvedCombination {
  readonly id: string;
  readonly name: string;
  /** Section of the analysis where it is another than the member's: the forces are unconfirmed. */
  readonly analysedWith: string | null;
  readonly P: GivenValue;
  readonly moments: Readonly<
    Record<'x' | 'y', { A: GivenValue; B: GivenValue; max: GivenValue | null }>
  >;
}

export interface ResolvedMember {
  readonly id: string;
  readonly mark: string;
  readonly section: Stated<string>;
  /** null: a shape of another family, outside the scope of the book. */
  readonly shape: WShape | null;
  readonly steel:
    | { readonly kind: 'grade'; readonly steel: Steel }
    | { readonly kind: 'own'; readonly name: string; readonly Fy: GivenValue };
  readonly length: GivenValue;
  readonly ends: Stated<Ends>;
  readonly Lcx: GivenValue | null;
  readonly Lcy: GivenValue | null;
  readonly Lcz: GivenValue | null;
  readonly Lb: GivenValue | null;
  readonly Cb: GivenValue | 'auto';
  readonly endMomentSign: 'bending' | 'joint';
  readonly combinations: readonly ResolvedCombination[];
}

export interface ResolvedInput {
  readonly source: CalculationInput;
  readonly design: 'LRFD' | 'ASD';
  readonly units: 'us' | 'si';
  readonly constants: 'us' | 'si';
  readonly analysis: {
    readonly method: 'direct' | 'effective-length' | 'first-order';
    readonly secondOrder: 'from-analysis' | 'amplified' | 'exact';
    readonly includesMemberEffect: boolean;
    readonly sway: 'none';
  };
  readonly sway: Stated<'none'>;
  readonly members: readonly ResolvedMember[];
}

export type ParsedInput =
  | { readonly ok: true; readonly input: ResolvedInput }
  | { readonly ok: false; readonly problems: readonly Problem[] };
