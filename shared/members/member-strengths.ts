import type { Line, LineOf } from '../calc/line.ts';
import type { Quantity } from '../calc/quantity.ts';
import type { Axis } from './bay-moments.ts';
import type { CompressionStrength } from './compression.ts';
import type { MajorStrengths } from './major-strengths.ts';
import type { MemberQuantities } from './member-quantities.ts';
import type { PlaneMoments } from './plane-moments.ts';
import type { ResolvedInput, ResolvedMember } from './resolved.ts';
import type { SectionQuantities, SteelQuantities } from './section-quantities.ts';
import type { TensionStrength } from './tension.ts';

/** What the member lines made available to every combination; null where it does not apply or is outside scope. */
export interface MemberStrengths {
  readonly input: ResolvedInput;
  readonly member: ResolvedMember;
  readonly q: MemberQuantities;
  readonly steel: SteelQuantities;
  readonly section: SectionQuantities;
  readonly alpha: Quantity | null;
  readonly compression: CompressionStrength | null;
  readonly tension: TensionStrength | null;
  readonly major: MajorStrengths | null;
  readonly Mcy: Quantity | null;
  readonly Cb: Quantity | null;
  /** Available shear strengths by the axis of bending. */
  readonly shear: Readonly<Record<Axis, Quantity | null>>;
}

export interface CombinationRun {
  readonly lines: readonly Line[];
  readonly checks: readonly LineOf<'check'>[];
  /** null where a step before it stopped the combination. */
  readonly planes: Readonly<Record<Axis, PlaneMoments | null>>;
  /** Whether its moments and loads bend the member. */
  readonly bends: Readonly<Record<Axis, boolean>>;
  /** Ids of its segments; one without id is the member. */
  readonly segments: readonly (string | null)[];
  /** Compressed, so that Chapter E and the second-order clauses apply. */
  readonly compressed: boolean;
  readonly tension: boolean;
}
