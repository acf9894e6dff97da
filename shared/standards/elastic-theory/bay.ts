import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import type { EndMoments } from './end-moments.ts';
import type { SecondOrder } from './second-order.ts';

/*
 * A bay is the stretch of a member between two neighbouring points held in the plane of bending. It
 * is pinned at both: its end moments are known, from the analysis or from the bays beside it.
 *
 * Places are lengths measured from the bay's start, end A. Moments are in the bending sense:
 * positive ones compress the upper face. Loads that are positive bend a simply supported bay so.
 * Shear is the slope of the moment: positive where the moment grows with the place.
 *
 *   firstOrderBay(r, at, bay): BayResult                          statics.ts
 *   secondOrderBay(r, at, bay, axial): BayResult | 'failed' | 'outside scope'
 *                                                                 second-order-bay.ts
 *
 * The first writes lines under `${at}/first/…`, the second under `${at}/…`, so both may stand in one
 * combination; `at` is `theory/x` or `theory/x/bay2`.
 */
export type BayLoad =
  | {
      readonly kind: 'uniform';
      /** Line load. */
      readonly w: Quantity;
      readonly from: Quantity;
      readonly to: Quantity;
    }
  | {
      readonly kind: 'linear';
      /** Line load at `from` and at `to`. */
      readonly wa: Quantity;
      readonly wb: Quantity;
      readonly from: Quantity;
      readonly to: Quantity;
    }
  | {
      readonly kind: 'point';
      /** Force. */
      readonly W: Quantity;
      readonly at: Quantity;
    };

export interface Bay {
  readonly axis: 'x' | 'y';
  /** Distance between the held points, above zero. */
  readonly L1: Quantity;
  /** From `endMoments`, which writes their lines; both moments may be zero. */
  readonly ends: EndMoments;
  /** 0 ≤ from < to ≤ L1, 0 < at < L1; anything else throws. */
  readonly loads: readonly BayLoad[];
}

/** What the axial force adds to a bay. */
export interface BayAxial {
  /** Factor that brings the axial force to the LRFD load level. */
  readonly alpha: Quantity;
  /** Compression positive, tension negative; not zero. */
  readonly Pr: Quantity;
  readonly EIstar: Quantity;
  /** Elastic critical load of the bay with pinned ends. */
  readonly Pe1: Quantity;
}

/** Where an extreme lies: at an end (`place` is null), or between at a place that has a line. */
export interface Extreme {
  /** With its sign, except in `largest.size`. */
  readonly M: Quantity;
  readonly end: 'A' | 'B' | null;
  /** From end A; null at an end. */
  readonly place: Quantity | null;
}

export interface BayResult {
  readonly order: 'first' | 'second';
  /** Signed moment at a place, 0 ≤ z ≤ L1. A place that has a moment already writes no line. */
  moment(r: Recorder, key: string, z: Quantity): Quantity;
  /** The largest moment between two places, ends included, as a size; writes its candidates. */
  largestWithin(r: Recorder, key: string, from: Quantity, to: Quantity): Quantity;
  readonly largest: {
    /** The largest moment as a size: what B1 amplifies, or Mr of the exact solution. */
    readonly size: Extreme;
    /** Algebraically the largest and the least moment, signed. Without loads: at the ends. */
    readonly highest: Extreme;
    readonly lowest: Extreme;
  };
  /** Shear at the ends, signed; null where the bay has no loads and an axial force. */
  readonly shear: { readonly A: Quantity; readonly B: Quantity } | null;
  /** The largest shear as a size, with its candidates; first order only, else null. */
  readonly largestShear: ((r: Recorder, key: string) => Quantity) | null;
  /**
   * Deflection from the chord, positive where a positive moment bends it; for information. Null
   * without a flexural rigidity (first order).
   */
  readonly deflection: ((r: Recorder, key: string, z: Quantity) => Quantity) | null;
  /**
   * End moments alone under compression: what the bay's clause says of them (kL, place,
   * amplification, Cm); null else.
   */
  readonly endMomentsOnly: SecondOrder | null;
}

/** Writes the lines of a bay without axial force under `${at}/first/`. */
export type FirstOrderBay = (r: Recorder, at: string, bay: Bay) => BayResult;

/**
 * Writes the lines of a bay with axial force under `${at}/`. Compression: αP must be below Pe1; at or
 * above it answers 'failed' and writes nothing, for the caller has said so (`belowCriticalLoad`).
 * 'outside scope', with a notice: a bay under so much tension that kL exceeds 10
 * (T above ten times Pe1); it carries load as a tie, and the first-order moments stand.
 */
export type SecondOrderBay = (
  r: Recorder,
  at: string,
  bay: Bay,
  axial: BayAxial,
) => BayResult | 'failed' | 'outside scope';
