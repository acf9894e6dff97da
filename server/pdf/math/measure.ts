import { __domTree, type LayoutNode, type Span, type SvgNode, type SymbolNode } from 'katex';
import type { Piece } from './formula.ts';
import { movePieces } from './formula.ts';
import { faceOf, type MathFace } from './katex-faces.ts';
import { allowStyle, em, UnknownLayoutError } from './node-style.ts';
import { classNames, enter, type Setting } from './setting.ts';
import { fitPath, parsePath } from './svg-path.ts';

/** Width of a run of text, in em of its own font size. */
export type RunWidth = (face: MathFace, text: string) => number;

/** A measured node: pieces relative to its left edge and baseline, in em of the base size. */
export interface Box {
  readonly width: number;
  readonly pieces: readonly Piece[];
  /** Set for what fills the width of the stack it stands in; its width is then the least one. */
  readonly fill?: (width: number) => readonly Piece[];
}

const emptyBox: Box = { width: 0, pieces: [] };

/** Width of `.nulldelimiter`, em (katex.css). */
const nullDelimiter = 0.12;

/** Measures one node of KaTeX's layout tree. Throws UnknownLayoutError on what it doesn't know. */
export function measureNode(node: LayoutNode, setting: Setting, runWidth: RunWidth): Box {
  if (node instanceof __domTree.SymbolNode) return measureSymbol(node, setting, runWidth);
  if (node instanceof __domTree.Span) return measureSpan(node, setting, runWidth);
  throw new UnknownLayoutError(`layout element ${node.constructor.name}`);
}

function measureSymbol(node: SymbolNode, outer: Setting, runWidth: RunWidth): Box {
  const setting = enter(outer, classNames(node.classes));
  allowStyle(node.style, ['paddingLeft', 'position', 'top']);
  const { size } = setting;
  const face = faceOf(setting.face);
  const width = runWidth(face, node.text) * size;
  const x = em(node.style, 'paddingLeft') * size;
  const y = em(node.style, 'top') * size;
  const italic = Math.max(node.italic, 0) * size;
  return {
    width: x + width + italic,
    pieces: [{ kind: 'glyphs', x, y, face, size, text: node.text, width }],
  };
}

function measureSpan(node: Span, outer: Setting, runWidth: RunWidth): Box {
  const names = classNames(node.classes);
  const setting = enter(outer, names);
  if (names.includes('katex-strut') || names.includes('katex-fix')) return emptyBox;
  if (names.includes('vlist-t')) return measureStack(node, setting, runWidth);
  const lineClass = names.find((name) => /^(frac|overline|underline)-line$/.test(name));
  if (lineClass) return measureLine(node, setting);
  const [first] = node.children;
  if (first instanceof __domTree.SvgNode) {
    return measureDrawing(node, first, setting, names.includes('hide-tail'));
  }
  if (names.includes('nulldelimiter')) return { width: nullDelimiter * setting.size, pieces: [] };
  const row = measureRow(node, setting, runWidth);
  return names.includes('rlap') || names.includes('accent-body') ? { ...row, width: 0 } : row;
}

/** Children side by side on one baseline. */
function measureRow(node: Span, setting: Setting, runWidth: RunWidth): Box {
  allowStyle(node.style, ['marginLeft', 'marginRight', 'paddingLeft', 'position', 'top', 'left']);
  const { size } = setting;
  const lengthOf = (property: string): number => em(node.style, property) * size;
  const dx = lengthOf('left');
  const dy = lengthOf('top');
  const start = lengthOf('marginLeft') + lengthOf('paddingLeft');
  let x = start;
  let [markStart, markEnd] = [start, start];
  const pieces: Piece[] = [];
  for (const child of joinBareSymbols(node.children)) {
    const box = measureNode(child, setting, runWidth);
    if (box.fill) throw new UnknownLayoutError('a stretched element outside a stack');
    pieces.push(...movePieces(box.pieces, x + dx, dy));
    const isSpace = child instanceof __domTree.Span && child.classes.includes('mspace');
    if (isSpace && markEnd === start) markStart = x + box.width;
    x += box.width;
    if (!isSpace) markEnd = x;
  }
  const attributes = dataOf(node);
  if (attributes) {
    pieces.push({
      kind: 'mark',
      x: Math.min(markStart, markEnd) + dx,
      y: dy,
      width: Math.max(markEnd - markStart, 0),
      height: node.height * size,
      depth: node.depth * size,
      attributes,
    });
  }
  return { width: x + lengthOf('marginRight'), pieces };
}

/** The `data-…` attributes of a group, or null. Throws on one that styles or names it. */
function dataOf(node: Span): Readonly<Record<string, string>> | null {
  const names = Object.keys(node.attributes).filter((name) => name !== 'aria-hidden');
  const other = names.find((name) => !name.startsWith('data-'));
  if (other) throw new UnknownLayoutError(`attribute "${other}"`);
  return names.length > 0 ? node.attributes : null;
}

/**
 * Neighbouring symbols without class or style are one run of text in KaTeX's HTML (the letters of
 * \sin), shaped and kerned together.
 */
function joinBareSymbols(nodes: readonly LayoutNode[]): LayoutNode[] {
  const isBare = (node: LayoutNode | undefined): node is SymbolNode =>
    node instanceof __domTree.SymbolNode &&
    classNames(node.classes).length === 0 &&
    Object.keys(node.style).length === 0 &&
    node.italic <= 0;
  const joined: LayoutNode[] = [];
  for (const node of nodes) {
    const last = joined.at(-1);
    if (isBare(node) && isBare(last))
      joined[joined.length - 1] = new __domTree.SymbolNode(last.text + node.text);
    else joined.push(node);
  }
  return joined;
}

/** KaTeX's vlist: elements above each other, each at its own offset from the common baseline. */
function measureStack(node: Span, setting: Setting, runWidth: RunWidth): Box {
  const list = spanAt(spanAt(node, 0), 0);
  const layers = list.children.map((child) => {
    if (!(child instanceof __domTree.Span))
      throw new UnknownLayoutError('a bare symbol in a stack');
    return measureLayer(child, setting, runWidth);
  });
  const width = Math.max(0, ...layers.map((layer) => layer.left + layer.box.width + layer.right));
  const pieces = layers.flatMap(({ left, right, y, box, align }) => {
    const room = width - left - right;
    if (box.fill) return movePieces(box.fill(room), left, y);
    return movePieces(box.pieces, left + (align === 'center' ? (room - box.width) / 2 : 0), y);
  });
  return { width, pieces };
}

function measureLayer(wrap: Span, outer: Setting, runWidth: RunWidth) {
  allowStyle(wrap.style, ['top', 'marginLeft', 'marginRight']);
  const setting = enter(outer, classNames(wrap.classes));
  const [strut, element, ...others] = wrap.children;
  const isStrut = strut instanceof __domTree.Span && strut.classes.includes('pstrut');
  if (!isStrut || !element || others.length > 0) throw new UnknownLayoutError('this kind of stack');
  const { size, align } = setting;
  return {
    left: em(wrap.style, 'marginLeft') * size,
    right: em(wrap.style, 'marginRight') * size,
    // The strut's foot stands on the element's baseline.
    y: (em(wrap.style, 'top') + em(strut.style, 'height')) * size,
    box: measureNode(element, setting, runWidth),
    align,
  };
}

function spanAt(node: Span, index: number): Span {
  const child = node.children[index];
  if (!(child instanceof __domTree.Span)) throw new UnknownLayoutError('this kind of stack');
  return child;
}

/** A fraction bar or overline: as wide as its stack, its foot on the baseline. */
function measureLine(node: Span, setting: Setting): Box {
  allowStyle(node.style, ['borderBottomWidth']);
  const thickness = em(node.style, 'borderBottomWidth') * setting.size;
  const fill = (width: number): Piece[] => [
    { kind: 'rule', x: 0, y: -thickness, width, thickness },
  ];
  return { width: 0, pieces: [], fill };
}

/**
 * A radical or a part of a tall delimiter, given as an SVG outline; its foot stands on the
 * baseline. A radical's outline runs on to the right and is cut at the width of its stack.
 */
function measureDrawing(node: Span, svg: SvgNode, setting: Setting, stretches: boolean): Box {
  allowStyle(node.style, stretches ? ['height', 'minWidth'] : ['height', 'width']);
  const [path, ...others] = svg.children;
  if (!(path instanceof __domTree.PathNode) || others.length > 0) {
    throw new UnknownLayoutError(`drawing with ${path?.constructor.name ?? 'nothing'} in it`);
  }
  if (!path.alternate) throw new UnknownLayoutError(`outline "${path.pathName}"`);
  const box = /^0 0 ([\d.]+) ([\d.]+)$/.exec(svg.attributes.viewBox ?? '');
  if (!box) throw new UnknownLayoutError(`view box "${svg.attributes.viewBox}"`);
  const height = em(node.style, 'height') * setting.size;
  const scale = height / Number(box[2]);
  const segments = parsePath(path.alternate);
  const fill = (width: number): Piece[] => [
    { kind: 'outline', x: 0, y: -height, path: fitPath(segments, scale, width) },
  ];
  if (stretches) return { width: em(node.style, 'minWidth') * setting.size, pieces: [], fill };
  const width = em(node.style, 'width') * setting.size;
  return { width, pieces: fill(width) };
}
