import type { Source } from '../calc/line.ts';
import type { GivenValue } from '../calc/quantity.ts';
import type { Section } from '../sections/section.ts';
import type { CalculationInput, Ends, Provision } from './input.ts';
import type { LoadHeight } from './load-input.ts';
import type { ResolvedSteel } from './material.ts';
import type { Hold } from './restraint-input.ts';

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

/** What is held between the ends, at a distance from end A. */
export interface ResolvedRestraint {
  /** `r1`, `r2`, … in the order of the places. */
  readonly id: string;
  readonly at: GivenValue;
  readonly holds: ReadonlySet<Hold>;
  readonly source: Source;
  readonly confirmed: boolean;
}

/** A load between the ends; `reach` null: the whole member. */
export type ResolvedLoad = {
  readonly id: string;
  readonly axis: 'x' | 'y';
  readonly height: LoadHeight;
} & (
  | { readonly kind: 'uniform'; readonly w: GivenValue; readonly reach: Reach | null }
  | {
      readonly kind: 'linear';
      readonly wFrom: GivenValue;
      readonly wTo: GivenValue;
      readonly reach: Reach | null;
    }
  | { readonly kind: 'point'; readonly W: GivenValue; readonly at: GivenValue }
);

interface Reach {
  readonly from: GivenValue;
  readonly to: GivenValue;
}

/** Moments over a restraint, bending sense. */
export interface ResolvedSupport {
  readonly restraint: string;
  readonly Mx: GivenValue | null;
  readonly My: GivenValue | null;
}

export interface SwayDirection {
  readonly MA: GivenValue | null;
  readonly MB: GivenValue | null;
  readonly Pstory: GivenValue;
  readonly PeStory: GivenValue | null;
  /** Story shear, height and drift of A-8-7; null where Pe,story is given. */
  readonly stiffness: {
    readonly H: GivenValue;
    readonly height: GivenValue;
    readonly drift: GivenValue;
    /** Load on the columns of moment frames, or what R_M is without it. */
    readonly RM: GivenValue | 'braced' | 'lower bound';
  } | null;
}

export interface ResolvedSway {
  readonly P: GivenValue | null;
  readonly x: SwayDirection | null;
  readonly y: SwayDirection | null;
}

/** Joint stiffness ratios for the alignment chart. */
export interface ResolvedChart {
  readonly sidesway: 'inhibited' | 'uninhibited';
  readonly GA: GivenValue;
  readonly GB: GivenValue;
}

export type NetSection =
  | { readonly Ae: GivenValue }
  | { readonly An: GivenValue; readonly U: GivenValue };

export interface ResolvedCombination {
  readonly id: string;
  readonly name: string;
  /** Section of the analysis where it is another than the member's: the forces are unconfirmed. */
  readonly analysedWith: string | null;
  readonly P: GivenValue;
  readonly moments: Readonly<
    Record<'x' | 'y', { A: GivenValue; B: GivenValue; max: GivenValue | null }>
  >;
  readonly supports: readonly ResolvedSupport[];
  readonly loads: readonly ResolvedLoad[];
  readonly shears: Readonly<Record<'x' | 'y', GivenValue | null>>;
  readonly sway: ResolvedSway | null;
}

export interface ResolvedMember {
  readonly id: string;
  readonly mark: string;
  readonly section: Stated<string>;
  /** null: a shape of another family, outside the scope of the book. */
  readonly shape: Section | null;
  readonly steel: ResolvedSteel;
  readonly length: GivenValue;
  readonly ends: Stated<Ends>;
  readonly Lcx: GivenValue | null;
  readonly Lcy: GivenValue | null;
  readonly Lcz: GivenValue | null;
  readonly Lb: GivenValue | null;
  readonly Cb: GivenValue | 'auto';
  /** In the order of their places; null: none are given, lengths are as stated. */
  readonly restraints: readonly ResolvedRestraint[] | null;
  readonly springs: Readonly<Partial<Record<'xA' | 'xB' | 'yA' | 'yB', GivenValue>>> | null;
  readonly charts: Readonly<Record<'x' | 'y', ResolvedChart | null>>;
  readonly netSection: NetSection | null;
  readonly stiffeners: GivenValue | null;
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
    readonly sway: 'none' | 'B2';
  };
  readonly sway: Stated<'none' | 'B2'>;
  readonly driftRatio: GivenValue | null;
  readonly provisions: ReadonlySet<Provision>;
  readonly members: readonly ResolvedMember[];
}

export type ParsedInput =
  | { readonly ok: true; readonly input: ResolvedInput }
  | { readonly ok: false; readonly problems: readonly Problem[] };
