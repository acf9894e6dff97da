import type { Verdict } from '../calc/line.ts';
import type { Scene } from '../figures/scene.ts';

/**
 * The document tree: what a template and a record become, and what the web page and the PDF both
 * render. Blocks hold finished text and TeX; nothing is computed in a renderer.
 */

/** A run of text inside a paragraph, a cell or a sentence. */
export type Inline =
  | {
      readonly kind: 'text';
      readonly text: string;
      readonly strong?: boolean;
      readonly quiet?: boolean;
    }
  | { readonly kind: 'math'; readonly tex: string; readonly text: string }
  /** A printed value that is a link to its line. */
  | {
      readonly kind: 'value';
      readonly text: string;
      readonly address: string;
      /** Id of the line's member, where the block belongs to none (tables of the whole report). */
      readonly member?: string;
    };

/**
 * One line of a sheet, in the three columns. `working` is TeX cut into chunks at which it may be
 * broken (the symbol, then `= …` per step); operands in it are wrapped in
 * \htmlData{ref=ADDRESS}{…}, ADDRESS being full (`c1:H1/ratio`).
 */
export interface LineBlock {
  readonly kind: 'line';
  readonly lineKind: string;
  /** Address within the member. */
  readonly address: string;
  readonly member: string;
  /** Printed number: `12.7`. */
  readonly number: string;
  /** `E3`, `E3-2`: clause, then equation. */
  readonly reference: { readonly clause: string; readonly equation: string };
  readonly title: string;
  readonly working: readonly string[];
  /** The whole line as text in one line, for copying, extraction and screen readers. */
  readonly text: string;
  /** Words in place of or under the working (choices, notices, comparisons, sources). */
  readonly sentence: readonly Inline[];
  readonly result: { readonly value: string; readonly unit: string } | null;
  /** Other printed form of the same result: `446.1 kip ft`. */
  readonly also: { readonly value: string; readonly unit: string } | null;
  readonly verdict: Verdict | null;
  readonly tone: 'plain' | 'note' | 'caution' | 'outside scope' | 'failed';
  /** Source letter and state of a given value. */
  readonly given: {
    readonly letter: 'T' | 'F' | 'D' | 'A';
    readonly source: string;
    readonly confirmed: boolean;
  } | null;
}

export interface TableCell {
  readonly content: readonly Inline[];
  readonly align?: 'left' | 'right';
  readonly tone?: 'plain' | 'quiet' | 'over' | 'strong';
}

export type Block =
  | {
      readonly kind: 'heading';
      readonly level: 1 | 2 | 3;
      readonly text: string;
      readonly id?: string;
    }
  | { readonly kind: 'paragraph'; readonly content: readonly Inline[] }
  | {
      readonly kind: 'list';
      readonly ordered: boolean;
      readonly items: readonly (readonly Inline[])[];
    }
  | {
      readonly kind: 'table';
      readonly caption: string;
      readonly head: readonly TableCell[];
      readonly rows: readonly (readonly TableCell[])[];
      /** Relative column widths. */
      readonly widths: readonly number[];
    }
  /** Title sheet: what it is, then labelled fields. */
  | {
      readonly kind: 'cover';
      readonly title: string;
      readonly number: string;
      readonly project: string;
      readonly fields: readonly {
        readonly label: string;
        readonly value: string;
        readonly tone?: 'plain' | 'over';
      }[];
      readonly notices: readonly string[];
      /** What it doesn't do and doesn't cover, in short. */
      readonly cautions: readonly string[];
    }
  /** Starts a member's sheet: a title block with mark, section, material. */
  | {
      readonly kind: 'sheetHead';
      readonly member: string;
      readonly mark: string;
      readonly section: string;
      readonly material: string;
    }
  /** Verdict with its ratio, the bar of the interaction terms against the limit, what governs. */
  | {
      readonly kind: 'verdict';
      readonly verdict: Verdict;
      readonly ratioText: string | null;
      readonly address: string | null;
      readonly terms: readonly {
        readonly label: string;
        readonly value: number;
        readonly text: string;
      }[];
      readonly limit: string;
      readonly governs: string;
      readonly combination: string;
    }
  | { readonly kind: 'figure'; readonly scene: Scene; readonly caption: string }
  /** A section's head inside a sheet, in serif, with its clause at the left. */
  | {
      readonly kind: 'lineSection';
      readonly reference: string;
      readonly title: string;
      readonly address: string;
      /** 2 and 3 are parts of the section before: a bay, a segment, a flange. */
      readonly level: 1 | 2 | 3;
      /** Whether a screen shows it folded until a reader opens it. */
      readonly folded: boolean;
      /** What it comes to, in one line, for where it is folded. */
      readonly outcome: { readonly content: readonly Inline[]; readonly over: boolean } | null;
    }
  | LineBlock
  | { readonly kind: 'cautions'; readonly items: readonly string[] }
  | { readonly kind: 'pageBreak' };

export type BlockKind = Block['kind'];
export type BlockOf<K extends BlockKind> = Extract<Block, { kind: K }>;

/** What every page repeats: the frame around the sheets. */
export interface PageFrame {
  readonly firm: string;
  readonly project: string;
  readonly calculation: string;
  readonly title: string;
  readonly revision: string;
  readonly date: string;
  readonly originator: string;
  readonly checker: string;
  /** `Preliminary, not issued`, or null once issued. */
  readonly marking: string | null;
  readonly foot: string;
  readonly paper: 'A4' | 'Letter';
}

export interface DocumentTree {
  readonly language: 'en';
  readonly title: string;
  readonly frame: PageFrame;
  readonly blocks: readonly Block[];
}
