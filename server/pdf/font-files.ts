import { fileURLToPath } from 'node:url';
import { type MathFace, mathFaces } from './math/katex-faces.ts';

/** The text faces; each name is also that of the file in `fonts`. */
export const textFaces = [
  'ibm-plex-sans-regular',
  'ibm-plex-sans-italic',
  'ibm-plex-sans-medium',
  'ibm-plex-sans-semibold',
  'ibm-plex-sans-condensed-regular',
  'ibm-plex-sans-condensed-medium',
  'ibm-plex-sans-condensed-semibold',
  'ibm-plex-serif-regular',
  'ibm-plex-serif-semibold',
  'ibm-plex-serif-italic',
  'ibm-plex-mono-regular',
] as const;

export type TextFace = (typeof textFaces)[number];
export type Face = TextFace | MathFace;

const isMathFace = (face: Face): face is MathFace => mathFaces.some((name) => name === face);

/** The bundled font file of a face. */
export function fontFile(face: Face): string {
  const file = isMathFace(face) ? `katex/katex-${face}.ttf` : `${face}.woff2`;
  return fileURLToPath(new URL(`../../fonts/${file}`, import.meta.url));
}
