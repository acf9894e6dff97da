/**
 * Every clause within reach of a member check, and what this book makes of it. `implemented` clauses
 * have formulas or rules here; the others say why not. Titles in our own words.
 */
export interface ManifestEntry {
  readonly clause: string;
  readonly title: string;
  readonly state: 'implemented' | 'not applicable' | 'outside scope';
  /** Why it is not implemented, or what of it is. */
  readonly because: string;
}

const done = (clause: string, title: string, because = ''): ManifestEntry => ({
  ...{ clause, title, state: 'implemented', because },
});
const none = (clause: string, title: string, because: string): ManifestEntry => ({
  ...{ clause, title, state: 'not applicable', because },
});
const outside = (clause: string, title: string, because: string): ManifestEntry => ({
  ...{ clause, title, state: 'outside scope', because },
});

export const manifest: readonly ManifestEntry[] = [
  none(
    'A',
    'General provisions',
    'steels by grade and by their own yield stress are taken as given',
  ),
  outside('B3', 'Design basis', 'loads and their combinations come from the analysis'),
  done('B4.1', 'Slender and compact elements', 'rows 1, 2, 5, 6, 8 to 11, 13, 15 to 17, 19 to 21'),
  done('B4.1b', 'Widths of the walls of tubes'),
  done('B4.2', 'Design wall thickness of tubes'),
  outside('B4.3', 'Gross and net areas', 'the net section is given, or An with U'),
  outside(
    'C1',
    'Stability of the structure',
    'the analysis of the structure is given; its method is stated',
  ),
  outside(
    'C2.1',
    'Required strengths',
    'the analysis is given; its load level and its limits are stated',
  ),
  done('C2.2b', 'Notional loads', 'as a formula for the library; the analysis holds them'),
  done('C2.3', 'Reduced stiffness for the analysis'),
  outside(
    'C3',
    'Available strengths',
    'effective length factors below 1 are given with their reason',
  ),
  done('App. 7.2', 'Effective length method'),
  done('App. 7.3', 'First-order analysis method'),
  done('Commentary App. 7.2', 'Alignment charts for the effective length'),
  done('App. 8.1.1', 'Amplified first-order strengths'),
  done('App. 8.1.2', 'Amplification between the ends, B1'),
  done('App. 8.1.3', 'Amplification for sway, B2'),
  done('Commentary App. 8.1.2', 'Equivalent moment with load between the supports'),
  outside(
    'App. 1',
    'Design by advanced analysis',
    'members are checked from forces of an ordinary analysis',
  ),
  outside('App. 6', 'Bracing', 'strength and stiffness of the braces are taken as given'),
  done('D1', 'Slenderness in tension'),
  done('D2', 'Tensile strength'),
  done('D3', 'Effective net area', 'shear lag factors of Table D3.1 are given, not looked up'),
  none('D4', 'Built-up tension members', 'built-up members here are welded along their length'),
  outside('D5', 'Pin-connected members', 'belongs to the connections'),
  none('D6', 'Eyebars', 'not a member of this kind'),
  done('E1', 'Available compressive strength'),
  done('E2', 'Slenderness in compression'),
  done('E3', 'Flexural buckling'),
  done('E4', 'Torsional and flexural-torsional buckling'),
  done('E4(d)', 'Twist about an offset restraint of the minor axis'),
  done(
    'E4(e)',
    'Twist about an offset restraint of the major axis',
    'as a formula; no restraint along a member gives it',
  ),
  done('E4(f)', 'Twist about an offset restraint, closed sections'),
  outside('E5', 'Single angles', 'angles are not among the sections'),
  outside(
    'E6',
    'Built-up members',
    'members of two shapes with connectors are not among the sections',
  ),
  done('E7', 'Members with slender elements'),
  done('E7.1', 'Effective width of slender elements'),
  done('E7.2', 'Effective area of round tubes'),
  done('F1', 'Available flexural strength and moment gradient'),
  done('F2.1', 'Yielding of compact I-shapes and channels'),
  done('F2.2', 'Lateral-torsional buckling of compact I-shapes and channels'),
  done('F3.2', 'Local buckling of the compression flange'),
  done('F4.1', 'Yielding of the compression flange, noncompact web or unequal flanges'),
  done('F4.2', 'Lateral-torsional buckling, noncompact web or unequal flanges'),
  done('F4.3', 'Local buckling of the flange, noncompact web or unequal flanges'),
  done('F4.4', 'Yielding of the tension flange, noncompact web or unequal flanges'),
  done('F5.1', 'Yielding of the compression flange, slender web'),
  done('F5.2', 'Lateral-torsional buckling, slender web'),
  done('F5.3', 'Local buckling of the flange, slender web'),
  done('F5.4', 'Yielding of the tension flange, slender web'),
  done('F6.1', 'Yielding about the minor axis'),
  done('F6.2', 'Local buckling of the flange about the minor axis'),
  done('F7', 'Rectangular tubes and boxes'),
  done('F7.1', 'Yielding of rectangular tubes and boxes'),
  done('F7.2', 'Local buckling of the flange, rectangular tubes and boxes'),
  done('F7.3', 'Local buckling of the web, rectangular tubes and boxes'),
  done('F7.4', 'Lateral-torsional buckling, rectangular tubes and boxes'),
  done('F8', 'Round tubes'),
  done('F8.1', 'Yielding of round tubes'),
  done('F8.2', 'Local buckling of round tubes'),
  outside('F9', 'Tees and double angles', 'not among the sections'),
  outside('F10', 'Single angles', 'not among the sections'),
  none('F11', 'Rectangular and round bars', 'not among the sections'),
  outside('F12', 'Unsymmetric shapes', 'not among the sections'),
  outside('F13.1', 'Holes in the tension flange', 'no holes are given'),
  done('F13.2', 'Limits of proportion of I-shapes'),
  done('G1', 'Available shear strength'),
  done('G2.1', 'Shear of webs'),
  done(
    'G2.2',
    'Buckling coefficients of plates in shear',
    'tension field action is not used, on the safe side',
  ),
  none('G3', 'Single angles and tees in shear', 'not among the sections'),
  done('G4', 'Shear of rectangular tubes and boxes'),
  done('G5', 'Shear of round tubes'),
  done('G6', 'Shear about the minor axis'),
  outside('G7', 'Openings in webs', 'no openings are given'),
  done('H1.1', 'Compression with bending'),
  done('H1.2', 'Tension with bending'),
  done('H1.3', 'Compression with bending about the major axis alone', 'where the basis chooses it'),
  done('H2', 'Combined stresses', 'where the basis chooses it'),
  outside('H3', 'Torsion', 'loads are taken through the shear centre'),
  outside('H4', 'Rupture of flanges with holes', 'no holes are given'),
  outside('I', 'Composite members', 'steel members only'),
  outside('J10', 'Concentrated forces on webs and flanges', 'belongs to the connections'),
  outside('K', 'Connections of tubes', 'belongs to the connections'),
  outside('L', 'Serviceability', 'deflections on a sheet are for information'),
  outside('App. 3', 'Fatigue', 'loads are taken as static'),
  outside('App. 4', 'Fire', 'strengths are those at ordinary temperature'),
  outside('App. 5', 'Existing structures', 'new members only'),
];
