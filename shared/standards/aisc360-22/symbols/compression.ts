import { type BookSymbol, symbol } from '../../book.ts';

/** Symbols of Chapter E beyond those of E3, E4(a) and the effective widths of rolled I-shapes. */
export const compression = {
  Pcx: symbol('P_{cx}', 'available compressive strength, buckling about the major axis', 'force'),
  Pcy: symbol('P_{cy}', 'available compressive strength, buckling about the minor axis', 'force'),
  xo: symbol('x_o', 'shear centre from the centroid, along x', 'length'),
  yo: symbol('y_o', 'shear centre from the centroid, along y', 'length'),
  ro: symbol('\\bar{r}_o', 'polar radius of gyration about the shear centre', 'length'),
  roa: symbol('r_o', 'polar radius of gyration about the lateral restraint', 'length'),
  xa: symbol('x_a', 'offset of the major-axis restraint from the shear centre, along x', 'length'),
  ya: symbol('y_a', 'offset of the minor-axis restraint from the shear centre, along y', 'length'),
  offset: symbol('a', 'offset of the lateral restraint from the shear centre', 'length'),
  H: symbol('H', 'flexural constant'),
  Fez: symbol('F_{ez}', 'elastic torsional buckling stress about the shear centre', 'stress'),
  Feft: symbol('F_{e,ft}', 'elastic flexural-torsional buckling stress', 'stress'),
  Fea: symbol('F_{e,a}', 'elastic torsional buckling stress about the lateral restraint', 'stress'),
  cubic: symbol('f(F_e)', 'left side of E4-4 over the product of the three stresses'),
  Aetrial: symbol('A_{e,calc}', 'effective area before its limit', 'area'),
  lambdaend: symbol('0.45E/F_y', 'slenderness of a round wall at which the rules end'),
  b2: symbol('b_2', 'width of the other flange', 'length'),
  be2: symbol('b_{e,2}', 'effective width of the other flange', 'length'),
  tf2: symbol('t_{f,2}', 'thickness of the other flange', 'length'),
  btop: symbol('b_{top}', 'half width of the top flange', 'length'),
  betop: symbol('b_{e,top}', 'effective half width of the top flange', 'length'),
  bbottom: symbol('b_{bot}', 'half width of the bottom flange', 'length'),
  bebottom: symbol('b_{e,bot}', 'effective half width of the bottom flange', 'length'),
} as const satisfies Record<string, BookSymbol>;
