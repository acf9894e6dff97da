import type { FontSet } from './font-set.ts';
import type { LinkOf } from './inline-lines.ts';
import type { Part, Row, Tag } from './items.ts';

/** What measuring a block needs to know of the document around it. */
export interface BlockContext {
  readonly fonts: FontSet;
  /** Width of the column of blocks, points. */
  readonly width: number;
  /** The section of the document's structure that the block stands in. */
  readonly sect: Tag;
  readonly linkOf: LinkOf;
}

/** The anchor of a member's line. */
export const anchorOf = (member: string, address: string): string => `${member} ${address}`;

/** A row with the usual choices. */
export const row = (height: number, parts: readonly Part[], more: Partial<Row> = {}): Row => ({
  height,
  before: 0,
  keep: false,
  parts,
  ...more,
});
