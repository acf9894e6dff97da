import type { DimensionName } from '../units/dimension.ts';
import { areEqual } from '../units/equal.ts';
import type { Source } from './line.ts';

/** A number with the reference of its line: what a procedure computes with. */
export interface Quantity {
  readonly ref: string;
  readonly symbol: string;
  readonly value: number;
  readonly dimension: DimensionName;
}

/** A value somebody gave: base units, as typed, with its source and state. */
export interface GivenValue {
  readonly value: number;
  readonly text: string;
  readonly source: Source;
  readonly confirmed: boolean;
}

/**
 * A plain number within a few bits of one with at most 12 digits is that number: 600 kip over
 * 1200 kip is 0.5 whatever the units it was computed in, so that limits met exactly are met. The
 * ratio of values that are equal is 1.
 */
export function withoutNoise(value: number, dimension: DimensionName): number {
  if (dimension !== 'none' || !Number.isFinite(value)) return value;
  if (areEqual(Math.abs(value), 1)) return Math.sign(value);
  const plain = Number(value.toPrecision(12));
  return Math.abs(value - plain) <= 8 * Number.EPSILON * Math.abs(plain) ? plain : value;
}
