import { formula } from './writer.ts';

/*
 * Shear deformation in second order, the shear taken normal to the rotated section (F. Engesser, 1891;
 * from memory): (1 − P/GAv) M″ + P/EI M = −q. A bay is solved with EI* and its loads changed by
 * 1 − P/GAv; the deflection gains M₀/(GAv − P), M₀ the first-order moment of simple supports there.
 */
export const shearFlexibilityFormulas = {
  remaining: formula({
    id: 'shear-remaining',
    clause: '13',
    title: 'Share of the shear stiffness that the axial force leaves',
    symbol: 'etav',
    dimension: 'none',
    expression: '1-alpha*Pr/GAv',
    operands: { alpha: 'none', Pr: 'force', GAv: 'force' },
    prints: 'display',
  }),
  rigidity: formula({
    id: 'shear-EI',
    clause: '13',
    title: 'Flexural rigidity with shear deformation',
    symbol: 'EIv',
    dimension: 'rigidity',
    expression: 'etav*EIstar',
    operands: { etav: 'none', EIstar: 'rigidity' },
  }),
  lineLoad: formula({
    id: 'shear-w',
    clause: '13',
    title: 'Line load with shear deformation',
    symbol: 'wv',
    dimension: 'lineLoad',
    expression: 'w/etav',
    operands: { w: 'lineLoad', etav: 'none' },
    prints: 'display',
  }),
  force: formula({
    id: 'shear-W',
    clause: '13',
    title: 'Force with shear deformation',
    symbol: 'Wv',
    dimension: 'force',
    expression: 'W/etav',
    operands: { W: 'force', etav: 'none' },
    prints: 'display',
  }),
  deflection: formula({
    id: 'shear-y',
    clause: '13',
    title: 'Deflection from shear',
    symbol: 'yv',
    dimension: 'deflection',
    expression: 'M/(GAv-alpha*Pr)',
    operands: { M: 'moment', GAv: 'force', alpha: 'none', Pr: 'force' },
  }),
};
