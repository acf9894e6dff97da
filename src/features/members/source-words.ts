import type { SourceLetter } from '#client/ui/source-ring.tsx';
import type { DraftSource } from '#shared/contracts/draft-quantity.ts';

export type SourceKind = DraftSource['kind'];

/** Where a value comes from, and whether somebody stands for it. */
export interface StatedBy {
  readonly source?: DraftSource | undefined;
  readonly confirmed: boolean;
}

export const sourceKinds: readonly { readonly value: SourceKind; readonly text: string }[] = [
  { value: 'typed', text: 'typed by hand' },
  { value: 'file', text: 'from a file' },
  { value: 'drawing', text: 'from a drawing' },
  { value: 'assumption', text: 'an assumption' },
];

const letters: Record<SourceKind, SourceLetter> = {
  typed: 'T',
  file: 'F',
  drawing: 'D',
  assumption: 'A',
};

export const draftSourceLetter = (source: DraftSource | undefined): SourceLetter =>
  letters[source?.kind ?? 'typed'];

/** A source in words, as far as it is filled in. */
export function draftSourceText(source: DraftSource | undefined): string {
  switch (source?.kind) {
    case undefined:
    case 'typed':
      return source?.note ? `typed, ${source.note}` : 'typed';
    case 'file':
      return `${source.file || 'a file without a name'}${source.row ? `, row ${source.row}` : ''}`;
    case 'drawing':
      return [
        source.number || 'a drawing without a number',
        source.revision && `rev ${source.revision}`,
        source.detail,
      ]
        .filter(Boolean)
        .join(' ');
    case 'assumption':
      return `assumption: ${source.basis || 'no reason given'}`;
  }
}

/** What a source still lacks; null when it is complete. */
export function sourceLack(source: DraftSource | undefined): string | null {
  switch (source?.kind) {
    case undefined:
    case 'typed':
      return null;
    case 'file':
      if (source.file.trim() === '') return 'Its source lacks the name of the file.';
      if (source.sha256 && !/^[0-9a-f]{64}$/.test(source.sha256))
        return 'The SHA-256 of its source is 64 digits of 0 to 9 and a to f.';
      return null;
    case 'drawing':
      if (source.number.trim() === '') return 'Its source lacks the number of the drawing.';
      return source.revision.trim() === '' ? 'Its source lacks the revision of the drawing.' : null;
    case 'assumption':
      return source.basis.trim() === '' ? 'The assumption lacks its reason.' : null;
  }
}

export function emptySource(kind: SourceKind): DraftSource {
  switch (kind) {
    case 'typed':
      return { kind };
    case 'file':
      return { kind, file: '' };
    case 'drawing':
      return { kind, number: '', revision: '' };
    case 'assumption':
      return { kind, basis: '' };
  }
}
