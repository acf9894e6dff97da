/** What a clause of a book without a manifest is about, in our own words, by book and clause. */
export const CLAUSE_TITLES: Readonly<Record<string, Readonly<Record<string, string>>>> = {
  'elastic-theory': {
    '0': 'Sense and size of end moments',
    '1': 'Axial parameter and moments along the member',
    '1.1': 'Largest moment and its place',
    '1.2': 'Equivalent moment factors',
    '2': 'Loads and moments of a stretch without axial force',
    '2.1': 'Places of zero and of extreme shear',
    '2.2': 'Slope and deflection without axial force',
    '6': 'Initial bow',
    '9': 'Rotational end springs and their critical load',
    '13': 'Shear deformation',
  },
  'section-properties': {
    Axes: 'Properties about an axis',
    Box: 'Box welded from plates',
    I: 'I-shape welded from plates, equal flanges',
    'Mono I': 'I-shape welded from plates, unequal flanges',
    Round: 'Round tube',
    Tube: 'Rectangular tube',
  },
};
