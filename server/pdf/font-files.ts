import { readFileSync } from 'node:fs';
import { type MathFace, mathFaces } from './math/katex-faces.ts';
import { unpackWoff } from './unpack-woff.ts';

/** The text faces; each name is also that of the file in `fonts`. */
export const textFaces = [
  'ibm-plex-sans-regular',
  'ibm-plex-sans-medium',
  'ibm-plex-sans-semibold',
  'ibm-plex-sans-condensed-regular',
  'ibm-plex-sans-condensed-semibold',
  'ibm-plex-serif-regular',
  'ibm-plex-serif-semibold',
  'ibm-plex-mono-regular',
] as const;

export type TextFace = (typeof textFaces)[number];
export type Face = TextFace | MathFace;

const isMathFace = (face: Face): face is MathFace => mathFaces.some((name) => name === face);

const bytes = new Map<Face, Buffer>();

/**
 * A face's TrueType file, kept once read. The text faces come as WOFF: the subset made of a WOFF2
 * file breaks on glyphs composed of others. (The web pages take the WOFF2 files beside them.)
 */
export function fontFile(face: Face): Buffer {
  const known = bytes.get(face);
  if (known) return known;
  const name = isMathFace(face) ? `katex/katex-${face}.ttf` : `${face}.woff`;
  const file = readFileSync(new URL(`../../fonts/${name}`, import.meta.url));
  const font = isMathFace(face) ? file : unpackWoff(file);
  bytes.set(face, font);
  return font;
}
