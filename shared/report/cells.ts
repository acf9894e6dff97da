import type { Summary } from '../calc/record.ts';
import { NOT_STATED } from './document-data.ts';
import { shortReference } from './reference-text.ts';
import type { TableCell } from './tree.ts';

export const cell = (words: string, tone?: TableCell['tone']): TableCell => ({
  content: [{ kind: 'text', text: words }],
  ...(tone ? { tone } : words === NOT_STATED ? { tone: 'quiet' } : {}),
});

export const strongCell = (words: string): TableCell => cell(words, 'strong');

/** Verdict and ratio; anything but OK stands out, in words as well. */
export const verdictCell = (summary: Pick<Summary, 'verdict'>): TableCell =>
  cell(summary.verdict, summary.verdict === 'OK' ? 'strong' : 'over');

/** The printed ratio as a link to its line, or a dash where there is none. */
export function ratioCell(
  ratioText: string | null,
  line: { readonly member: string; readonly address: string } | null,
): TableCell {
  if (ratioText === null) return { content: [{ kind: 'text', text: '–' }], align: 'right' };
  return {
    content: [
      line === null
        ? { kind: 'text', text: ratioText }
        : { kind: 'value', text: ratioText, ...line },
    ],
    align: 'right',
  };
}

/** `H1-1a, flexure and compression`, or why nothing governs. */
export const governsText = ({ governing }: Summary): string =>
  governing === null ? '–' : `${shortReference(governing.clause)}, ${governing.title}`;
