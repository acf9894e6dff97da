import { createContext, useContext } from 'react';
import type { BlockOf } from '#shared/report/tree.ts';

/** Which sections are folded, of a sheet whose sections can be. */
export interface Folds {
  readonly isFolded: (section: BlockOf<'lineSection'>) => boolean;
  readonly fold: (address: string, folded: boolean) => void;
}

/** What a document needs of the page around it: the chosen line, and where numbers lead. */
export interface DocumentContext {
  /** Address of the chosen line. */
  readonly chosen: string | null;
  /** Addresses of the lines that the chosen one came from. */
  readonly lit: ReadonlySet<string>;
  /** Follows a number to its line; without it numbers are plain text. */
  readonly follow: ((address: string, member: string | undefined) => void) | null;
  /** Which line or head of a section the keyboard stands on; one of a sheet is in the tab order. */
  readonly current: string | null;
  readonly onCurrent: ((address: string) => void) | null;
  /** Fields of a sheet's title block, beside the member's own. */
  readonly titleFields: readonly { readonly label: string; readonly value: string }[];
  /** Without it every section stands open. */
  readonly folds: Folds | null;
}

const plain: DocumentContext = {
  chosen: null,
  lit: new Set(),
  follow: null,
  current: null,
  onCurrent: null,
  titleFields: [],
  folds: null,
};

export const DocumentContext = createContext<DocumentContext>(plain);
export const useDocument = (): DocumentContext => useContext(DocumentContext);
export const plainDocument = plain;
