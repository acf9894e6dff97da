import { formula } from './writer.ts';

// G1: the required shear strength is a size.
export const g1Formulas = {
  size: formula({
    id: 'G1-size',
    clause: 'G1',
    title: 'Size of the shear force',
    symbol: 'Vr',
    dimension: 'force',
    expression: 'abs(V)',
    operands: { V: 'force' },
    prints: 'display',
  }),
};
