import { __renderToHTMLTree } from 'katex';
import type { Formula } from './formula.ts';
import { measureNode, type RunWidth } from './measure.ts';
import { baseSetting } from './setting.ts';

/**
 * Lays out a TeX formula with KaTeX and measures it. Operands wrapped in
 * `\htmlData{ref=ADDRESS}{…}` keep their boxes as marks (`data-ref`). Throws KaTeX's ParseError on
 * wrong TeX and UnknownLayoutError on a construct the setter doesn't know.
 */
export function setFormula(tex: string, runWidth: RunWidth, displayMode = true): Formula {
  const tree = __renderToHTMLTree(tex, {
    displayMode,
    trust: true,
    strict: false,
    throwOnError: true,
  });
  const { width, pieces } = measureNode(tree, baseSetting, runWidth);
  return { width, height: tree.height, depth: tree.depth, pieces };
}
