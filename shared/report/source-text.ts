import type { Source } from '../calc/line.ts';

export type SourceLetter = 'T' | 'F' | 'D' | 'A';

const LETTERS: Record<Source['kind'], SourceLetter> = {
  typed: 'T',
  file: 'F',
  drawing: 'D',
  assumption: 'A',
};

export const sourceLetter = (source: Source): SourceLetter => LETTERS[source.kind];

/** Where a given value comes from, in words: `drawing S-201 revision C, grid 4/B`. */
export function sourceText(source: Source): string {
  switch (source.kind) {
    case 'typed':
      return source.note ? `typed, ${source.note}` : 'typed';
    case 'file':
      return [
        `file ${source.file}`,
        source.row === undefined ? null : `row ${source.row}`,
        source.sha256 === undefined ? null : `SHA-256 ${source.sha256.slice(0, 12)}…`,
      ]
        .filter((part) => part !== null)
        .join(', ');
    case 'drawing':
      return `drawing ${source.number} revision ${source.revision}${source.detail ? `, ${source.detail}` : ''}`;
    case 'assumption':
      return `assumption: ${source.basis}`;
  }
}
