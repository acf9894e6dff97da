/** Version of what a run computes; it moves with every change of a published or golden result. */
export const ENGINE_VERSION = '0.2.1';

/** What changed in results, newest first. */
export const RESULT_CHANGES: readonly { readonly version: string; readonly change: string }[] = [
  {
    version: '0.2.1',
    change:
      'Values that differ by less than 5×10⁻¹³ of the larger one are equal in comparisons and checks: only results that hang on the last bits of a number change. A member with end springs and without compression takes the reduced stiffness of the direct analysis.',
  },
  {
    version: '0.2.0',
    change:
      'Every section kind of the tables and by sizes; members by bays and segments from restraints, with loads between the ends, end springs and sway by B2; tension (D2, H1.2), shear (G), F4, F5, F7, F8, E4(b) to (f), E7 for all elements, H1.3 and H2. Members given as before keep every value; shear is checked beside, a web that is not compact and tension are checked where they were not.',
  },
  {
    version: '0.1.0',
    change: 'First results: ANSI/AISC 360-22 for rolled W shapes, elastic theory.',
  },
];
