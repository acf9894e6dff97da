import type { Quantity } from '../../calc/quantity.ts';
import type { Recorder } from '../../calc/recorder.ts';
import { formula } from './writer.ts';

/* What every section has, whatever its sizes: S. P. Timoshenko, Strength of Materials (from memory). */
export const axesFormulas = {
  radius: formula({
    id: 'r',
    clause: 'Axes',
    title: 'Radius of gyration',
    symbol: 'r',
    dimension: 'length',
    expression: 'sqrt(I/A)',
    operands: { I: 'inertia', A: 'area' },
  }),
  modulus: formula({
    id: 'S',
    clause: 'Axes',
    title: 'Elastic modulus about an axis of symmetry',
    symbol: 'S',
    dimension: 'modulus',
    expression: '2*I/d',
    operands: { I: 'inertia', d: 'length' },
  }),
};

type Axis = 'x' | 'y';
export const AXIS_WORDS = { x: 'major axis', y: 'minor axis' } as const satisfies Record<
  Axis,
  string
>;

/** r = √(I/A) about one axis. */
export const radius = (r: Recorder, axis: Axis, I: Quantity, A: Quantity): Quantity =>
  r.formula(
    axesFormulas.radius,
    `section/r${axis}`,
    { I, A },
    { symbol: `r${axis}`, title: `Radius of gyration, ${AXIS_WORDS[axis]}` },
  );

/** S = 2I/d where the axis halves `d`, the size of the section across it. */
export const modulus = (r: Recorder, axis: Axis, I: Quantity, d: Quantity): Quantity =>
  r.formula(
    axesFormulas.modulus,
    `section/S${axis}`,
    { I, d },
    { symbol: `S${axis}`, title: `Elastic modulus, ${AXIS_WORDS[axis]}` },
  );
