/**
 * Steels by grade with both published sets of constants (US customary and SI).
 * ASTM A992/A992M, A572/A572M Grade 50 [345], A36/A36M, A913/A913M Grades 65 [450] and 70 [485]:
 * specified minimum values, as in ANSI/AISC 360-22 A3.1 and the ASTM standards (from memory; the US
 * values of A992 agree with AISC Design Examples v16.0).
 */
export interface Steel {
  readonly key: string;
  readonly title: string;
  readonly us: { readonly Fy: string; readonly Fu: string };
  readonly si: { readonly Fy: string; readonly Fu: string };
}

export const STEELS: readonly Steel[] = [
  {
    key: 'A992',
    title: 'ASTM A992/A992M',
    us: { Fy: '50 ksi', Fu: '65 ksi' },
    si: { Fy: '345 MPa', Fu: '450 MPa' },
  },
  {
    key: 'A572 Gr. 50',
    title: 'ASTM A572/A572M Grade 50 [345]',
    us: { Fy: '50 ksi', Fu: '65 ksi' },
    si: { Fy: '345 MPa', Fu: '450 MPa' },
  },
  {
    key: 'A36',
    title: 'ASTM A36/A36M',
    us: { Fy: '36 ksi', Fu: '58 ksi' },
    si: { Fy: '250 MPa', Fu: '400 MPa' },
  },
  {
    key: 'A913 Gr. 65',
    title: 'ASTM A913/A913M Grade 65 [450]',
    us: { Fy: '65 ksi', Fu: '80 ksi' },
    si: { Fy: '450 MPa', Fu: '550 MPa' },
  },
  {
    key: 'A913 Gr. 70',
    title: 'ASTM A913/A913M Grade 70 [485]',
    us: { Fy: '70 ksi', Fu: '90 ksi' },
    si: { Fy: '485 MPa', Fu: '620 MPa' },
  },
];

export const findSteel = (key: string): Steel | undefined => {
  const plain = (s: string) =>
    s.toUpperCase().replace(/[\s.]/g, '').replace(/^ASTM/, '').replace('GRADE', 'GR');
  return STEELS.find((s) => plain(s.key) === plain(key));
};

/** E and G: ANSI/AISC 360-22, symbols and C2.3/E4; 29 000 ksi [200 000 MPa], 11 200 ksi [77 200 MPa]. */
export const MODULI = {
  us: { E: '29000 ksi', G: '11200 ksi' },
  si: { E: '200000 MPa', G: '77200 MPa' },
} as const;
