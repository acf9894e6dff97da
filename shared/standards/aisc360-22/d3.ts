import { formula } from './writer.ts';

// D3 effective net area of a member in tension.
export const d3Formulas = {
  effectiveNetArea: formula({
    id: 'D3-1',
    clause: 'D3',
    equation: 'D3-1',
    title: 'Effective net area',
    symbol: 'Ae',
    dimension: 'area',
    expression: 'An*U',
    operands: { An: 'area', U: 'none' },
  }),
};
