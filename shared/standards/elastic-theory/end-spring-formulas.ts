import type { DimensionName } from '../../units/dimension.ts';
import { formula } from './writer.ts';

/*
 * A bay between rotational springs, by initial values from end A: M(A) = −kA θA, y(A) = y(B) = 0 and
 * M(B) = kB θB give θA. With χ = αP L²/EI* (tension negative) and
 * Φₙ(χ) = 1/n! − χ/(n + 2)! + χ²/(n + 4)! − …, the determinant is
 * F = Φ₁ + (κA + κB)(Φ₂ − Φ₃) + κA κB (Φ₃ − 2Φ₄), Φ₁ = 1 − χΦ₃, Φ₀ = 1 − χΦ₂, κ = kL/EI*. It is
 * (s + κA)(s + κB) − (sc)² of the stability functions times Φ₃ − 2Φ₄, and has no pole: its first zero is
 * the critical load. By hand; s and sc as in M. R. Horne, W. Merchant, The Stability of Frames,
 * Pergamon 1965 (from memory).
 */
const PHI1 = '(1-chi*Phi3(chi))';

export const springFormulas = {
  relative: formula({
    id: 'spring-relative',
    clause: '9',
    title: 'Relative stiffness of an end spring',
    symbol: 'kap',
    dimension: 'none',
    expression: 'k*L1/EIstar',
    operands: { k: 'rotationalStiffness', L1: 'length', EIstar: 'rigidity' },
  }),
  criticalAngle: formula({
    id: 'spring-critical',
    clause: '9',
    title: 'Axial parameter kL of the critical load',
    symbol: 'F',
    dimension: 'none',
    expression:
      'sin(bcr)/bcr+(kapA+kapB)*(Phi2(bcr^2)-Phi3(bcr^2))+kapA*kapB*(Phi3(bcr^2)-2*Phi4(bcr^2))',
    operands: { bcr: 'angle', kapA: 'none', kapB: 'none' },
  }),
  criticalLoad: formula({
    id: 'spring-Pcr',
    clause: '9',
    title: 'Elastic critical load with the end springs',
    symbol: 'Pcr',
    dimension: 'force',
    expression: 'bcr^2*EIstar/L1^2',
    operands: { bcr: 'angle', EIstar: 'rigidity', L1: 'length' },
  }),
  share: formula({
    id: 'spring-share',
    clause: '9',
    title: 'Share of the critical load',
    symbol: 'rhocr',
    dimension: 'none',
    expression: 'alpha*Pr/Pcr',
    operands: { alpha: 'none', Pr: 'force', Pcr: 'force' },
    prints: 'display',
  }),
  parameter: formula({
    id: 'spring-chi',
    clause: '9',
    title: 'Axial parameter (kL)², tension negative; Φₙ(χ) = 1/n! − χ/(n + 2)! + χ²/(n + 4)! − …',
    symbol: 'chi',
    dimension: 'none',
    expression: 'alpha*Pr*L1^2/EIstar',
    operands: { alpha: 'none', Pr: 'force', L1: 'length', EIstar: 'rigidity' },
  }),
  stiffness: formula({
    id: 'spring-F',
    clause: '9',
    title: 'Determinant of the bay with its springs, zero at the critical load',
    symbol: 'F',
    dimension: 'none',
    expression: `${PHI1}+(kapA+kapB)*(Phi2(chi)-Phi3(chi))+kapA*kapB*(Phi3(chi)-2*Phi4(chi))`,
    operands: { chi: 'none', kapA: 'none', kapB: 'none' },
  }),
  rotation: formula({
    id: 'spring-thA',
    clause: '9',
    title: 'Rotation of end A',
    symbol: 'thA',
    dimension: 'angle',
    expression: `(Phi3(chi)*(mL*L1/EIstar+kapB*tauL)-etaL*(${PHI1}+kapB*Phi2(chi)))/F`,
    operands: {
      chi: 'none',
      mL: 'moment',
      L1: 'length',
      EIstar: 'rigidity',
      kapB: 'none',
      tauL: 'angle',
      etaL: 'angle',
      F: 'none',
    },
  }),
  momentA: formula({
    id: 'spring-MA',
    clause: '9',
    title: 'Moment that the spring at end A takes',
    symbol: 'MA',
    dimension: 'moment',
    expression: '-k*thA',
    operands: { k: 'rotationalStiffness', thA: 'angle' },
  }),
  shearA: formula({
    id: 'spring-VA',
    clause: '9',
    title: 'Shear at end A',
    symbol: 'VA',
    dimension: 'force',
    expression: 'EIstar*(thA*(1+kapA*Phi2(chi))+etaL)/(L1^2*Phi3(chi))',
    operands: {
      EIstar: 'rigidity',
      thA: 'angle',
      kapA: 'none',
      chi: 'none',
      etaL: 'angle',
      L1: 'length',
    },
  }),
  momentB: formula({
    id: 'spring-MB',
    clause: '9',
    title: 'Moment that the spring at end B takes',
    symbol: 'MB',
    dimension: 'moment',
    expression: `MA*(1-chi*Phi2(chi))+VA*L1*${PHI1}-mL`,
    operands: { MA: 'moment', chi: 'none', VA: 'force', L1: 'length', mL: 'moment' },
  }),
  momentSum: formula({
    id: 'held-m-sum',
    clause: '9',
    title: 'Moment of the loads at end B, held at end A alone',
    symbol: 'mL',
    dimension: 'moment',
    expression: 'mL+mi',
    operands: { mL: 'moment', mi: 'moment' },
    prints: 'display',
  }),
  slopeSum: formula({
    id: 'held-slope-sum',
    clause: '9',
    title: 'Slope of end B under the loads, held at end A alone',
    symbol: 'tauL',
    dimension: 'angle',
    expression: 'tauL+taui',
    operands: { tauL: 'angle', taui: 'angle' },
  }),
  chordSum: formula({
    id: 'held-y-sum',
    clause: '9',
    title: 'Deflection of end B over the length, held at end A alone',
    symbol: 'etaL',
    dimension: 'angle',
    expression: 'etaL+etai',
    operands: { etaL: 'angle', etai: 'angle' },
  }),
};

/** (L − p)ⁿ Φₙ at the distance that is left behind p. */
const behind = (n: number, p: 'a' | 'b'): string => `(L1-${p})^${n}*Phi${n}(chi*((L1-${p})/L1)^2)`;

/** The moment, slope and deflection of end B from one load: n is 2, 3 or 4. */
const TEXTS = {
  whole: (n: number) => `w*L1^${n}*Phi${n}(chi)`,
  uniform: (n: number) => `w*(${behind(n, 'a')}-${behind(n, 'b')})`,
  linear: (n: number) =>
    `(wa*${behind(n, 'a')}-wb*${behind(n, 'b')}+(wb-wa)*(${behind(n + 1, 'a')}-${behind(n + 1, 'b')})/(b-a))`,
  point: (n: number) =>
    n === 2 ? 'W*(L1-a)*(1-chi*((L1-a)/L1)^2*Phi3(chi*((L1-a)/L1)^2))' : `W*${behind(n - 1, 'a')}`,
};
const LOADS: Readonly<Record<keyof typeof TEXTS, Readonly<Record<string, DimensionName>>>> = {
  whole: { w: 'lineLoad' },
  uniform: { w: 'lineLoad', a: 'length', b: 'length' },
  linear: { wa: 'lineLoad', wb: 'lineLoad', a: 'length', b: 'length' },
  point: { W: 'force', a: 'length' },
};

const heldBy = (kind: keyof typeof TEXTS) => {
  const known = { ...LOADS[kind], chi: 'none', L1: 'length' } as const;
  return {
    m: formula({
      id: `held-m-${kind}`,
      clause: '9',
      title: 'Moment of the load at end B, held at end A alone',
      symbol: 'mi',
      dimension: 'moment',
      expression: TEXTS[kind](2),
      operands: known,
      prints: 'display',
    }),
    slope: formula({
      id: `held-slope-${kind}`,
      clause: '9',
      title: 'Slope of end B under the load, held at end A alone',
      symbol: 'taui',
      dimension: 'angle',
      expression: `${TEXTS[kind](3)}/EIstar`,
      operands: { ...known, EIstar: 'rigidity' },
    }),
    chord: formula({
      id: `held-y-${kind}`,
      clause: '9',
      title: 'Deflection of end B under the load over the length, held at end A alone',
      symbol: 'etai',
      dimension: 'angle',
      expression: `${TEXTS[kind](4)}/(EIstar*L1)`,
      operands: { ...known, EIstar: 'rigidity' },
    }),
  };
};
export const heldLoad = {
  whole: heldBy('whole'),
  uniform: heldBy('uniform'),
  linear: heldBy('linear'),
  point: heldBy('point'),
};

export const heldLoadFormulas = Object.values(heldLoad).flatMap((f) => Object.values(f));
