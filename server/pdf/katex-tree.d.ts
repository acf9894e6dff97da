/**
 * KaTeX's own layout tree, as `katex.__renderToHTMLTree` builds it (KaTeX 0.19). The published
 * types leave it out because it is internal; an unknown shape in it throws in `math/`, so a new
 * KaTeX version can't change a page unseen.
 */
import 'katex';

declare module 'katex' {
  type LayoutStyle = Readonly<Record<string, string | undefined>>;

  interface LayoutBase {
    /** May hold empty entries and `undefined`, as KaTeX leaves them. */
    readonly classes: readonly (string | undefined)[];
    /** Em of the node's own font size, above and below the baseline. */
    readonly height: number;
    readonly depth: number;
    readonly style: LayoutStyle;
  }

  class Span implements LayoutBase {
    readonly classes: readonly (string | undefined)[];
    readonly height: number;
    readonly depth: number;
    readonly style: LayoutStyle;
    readonly attributes: Readonly<Record<string, string>>;
    readonly children: readonly LayoutNode[];
  }

  class SymbolNode implements LayoutBase {
    constructor(text: string);
    readonly classes: readonly (string | undefined)[];
    readonly height: number;
    readonly depth: number;
    readonly style: LayoutStyle;
    readonly text: string;
    /** Italic correction, em: space after the glyph. */
    readonly italic: number;
  }

  class PathNode {
    readonly pathName: string;
    /** Path data, when it isn't one of KaTeX's named outlines. */
    readonly alternate?: string | null;
  }

  class SvgNode {
    readonly attributes: Readonly<Record<string, string>>;
    readonly children: readonly object[];
  }

  type LayoutNode = Span | SymbolNode | SvgNode | object;

  export const __renderToHTMLTree: (
    tex: string,
    options: {
      displayMode: boolean;
      trust: boolean;
      strict: boolean | ((code: string) => 'error' | 'ignore');
      throwOnError: boolean;
    },
  ) => Span;

  export const __domTree: {
    readonly Span: typeof Span;
    readonly SymbolNode: typeof SymbolNode;
    readonly SvgNode: typeof SvgNode;
    readonly PathNode: typeof PathNode;
  };
}
