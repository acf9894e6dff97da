import { type BookSymbol, symbol } from '../../book.ts';

/** Symbols of Chapter C, Appendices 7 and 8 and the alignment charts. */
export const stability = {
  Yi: symbol('Y_i', 'gravity load applied at the level', 'force'),
  Ni: symbol('N_i', 'additional lateral load at the level', 'force'),
  Nitrial: symbol('N_{i,calc}', 'additional lateral load before its lower limit', 'force'),
  Nileast: symbol('N_{i,min}', 'least additional lateral load at the level', 'force'),
  Delta: symbol('\\Delta', 'first-order drift of the story', 'deflection'),
  Lstory: symbol('L', 'height of the story', 'length'),
  Pe: symbol('P_e', 'elastic critical load of the beam, pinned ends', 'force'),
  beamShare: symbol('\\alpha P_r/P_e', 'axial force over the elastic critical load of the beam'),
  Pnt: symbol('P_{nt}', 'first-order axial force without lateral translation', 'force'),
  Plt: symbol('P_{lt}', 'first-order axial force due to lateral translation', 'force'),
  Mlt: symbol('M_{lt}', 'first-order moment due to lateral translation', 'moment'),
  B2: symbol('B_2', 'multiplier for the effect of lateral translation of the story'),
  B2trial: symbol('B_{2,calc}', 'story multiplier before its lower limit'),
  Pstory: symbol('P_{story}', 'vertical load on the story', 'force'),
  Pmf: symbol('P_{mf}', 'vertical load on the columns of moment frames of the story', 'force'),
  Pestory: symbol('P_{e,story}', 'elastic critical strength of the story', 'force'),
  storyShare: symbol('\\alpha P_{story}/P_{e,story}', 'story load over its critical strength'),
  RM: symbol('R_M', 'coefficient for the effect of member curvature on the story'),
  Hstory: symbol('H', 'story shear that produces the drift', 'force'),
  DeltaH: symbol('\\Delta_H', 'first-order drift of the story due to its shear', 'deflection'),
} as const satisfies Record<string, BookSymbol>;
