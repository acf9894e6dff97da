/** KaTeX's fonts used for mathematics; each name is also that of the file in `fonts/katex`. */
export const mathFaces = [
  'main-regular',
  'main-bold',
  'main-italic',
  'main-bolditalic',
  'math-italic',
  'math-bolditalic',
  'size1-regular',
  'size2-regular',
  'size3-regular',
  'size4-regular',
  'ams-regular',
] as const;

export type MathFace = (typeof mathFaces)[number];

/** What KaTeX's style sheet sets with a class: family, weight and slant are inherited separately. */
export interface FaceChange {
  readonly family?: 'main' | 'math' | 'ams' | 'size1' | 'size2' | 'size3' | 'size4';
  readonly bold?: boolean;
  readonly italic?: boolean;
}

/** The font rules of katex.css for the classes that name a font. */
export const faceOfClass: Readonly<Record<string, FaceChange>> = {
  textbf: { bold: true },
  textit: { italic: true },
  textrm: { family: 'main' },
  mathnormal: { family: 'math', italic: true },
  mathit: { family: 'main', italic: true },
  mathrm: { italic: false },
  mathbf: { family: 'main', bold: true },
  boldsymbol: { family: 'math', bold: true, italic: true },
  amsrm: { family: 'ams' },
  mathbb: { family: 'ams' },
  mainrm: { family: 'main', italic: false },
  'small-op': { family: 'size1' },
  'large-op': { family: 'size2' },
  'delim-size1': { family: 'size1' },
  'delim-size4': { family: 'size4' },
};

/**
 * The face for a family, weight and slant. Throws if KaTeX's fonts have no such face (a browser
 * would synthesise one).
 */
export function faceOf(face: Required<FaceChange>): MathFace {
  const cut = `${face.bold ? 'bold' : ''}${face.italic ? 'italic' : ''}` || 'regular';
  const name = `${face.family}-${cut}`;
  const known = mathFaces.find((item) => item === name);
  if (!known) throw new Error(`mathematics: no face "${name}" among KaTeX's fonts`);
  return known;
}
