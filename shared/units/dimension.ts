/**
 * Dimensions as exponents of force and length. Every value in the core is a plain number in one
 * coherent base: N, mm, and so MPa (N/mm²) and N mm.
 */
export const DIMENSIONS = {
  none: { force: 0, length: 0 },
  angle: { force: 0, length: 0 },
  length: { force: 0, length: 1 },
  area: { force: 0, length: 2 },
  modulus: { force: 0, length: 3 },
  inertia: { force: 0, length: 4 },
  warping: { force: 0, length: 6 },
  perLength: { force: 0, length: -1 },
  force: { force: 1, length: 0 },
  stress: { force: 1, length: -2 },
  moment: { force: 1, length: 1 },
  rigidity: { force: 1, length: 2 },
  lineLoad: { force: 1, length: -1 },
  loadSlope: { force: 1, length: -2 },
  rotationalStiffness: { force: 1, length: 1 },
  deflection: { force: 0, length: 1 },
} as const;

export type DimensionName = keyof typeof DIMENSIONS;

export const DIMENSION_NAMES = Object.keys(DIMENSIONS) as [DimensionName, ...DimensionName[]];

/** What a person calls the dimension, for messages. */
export const DIMENSION_WORDS: Record<DimensionName, string> = {
  none: 'a plain number',
  angle: 'an angle',
  length: 'a length',
  area: 'an area',
  modulus: 'a section modulus',
  inertia: 'a second moment of area',
  warping: 'a warping constant',
  perLength: 'a reciprocal length',
  force: 'a force',
  stress: 'a stress',
  moment: 'a moment',
  rigidity: 'a flexural rigidity',
  lineLoad: 'a load per length',
  loadSlope: 'a change of load per length',
  rotationalStiffness: 'a rotational stiffness',
  deflection: 'a deflection',
};
