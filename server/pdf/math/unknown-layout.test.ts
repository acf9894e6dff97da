import { __domTree } from 'katex';
import { describe, expect, test } from 'vitest';
import { measureNode } from './measure.ts';
import { UnknownLayoutError } from './node-style.ts';
import { setFormula } from './set-formula.ts';
import { baseSetting } from './setting.ts';
import { parsePath } from './svg-path.ts';

const halfEm = (): number => 0.5;

describe('a construct the setter doesn’t know is an error that names it, not a hole in the page', () => {
  test.each([
    [String.raw`\htmlClass{wide}{x}`, 'class "wide"'],
    [String.raw`\begin{matrix}a&b\end{matrix}`, 'class "mtable"'],
    [String.raw`\cancel{x}`, 'drawing with LineNode'],
    [String.raw`\sqrt[3]{x}`, 'class "katex-root"'],
    [String.raw`\textsf{x}`, 'class "textsf"'],
    [String.raw`\vec{x}`, 'class "katex-overlay"'],
    [String.raw`\widehat{abc}`, 'outline "widehat2"'],
    [String.raw`\color{red}x`, 'style "color: red"'],
    [String.raw`\htmlStyle{font-size: 3em}{x}`, 'attribute "style"'],
    [String.raw`\raisebox{1em}{x}`, 'layout element'],
  ])('%s', (tex, named) => {
    expect(() => setFormula(tex, halfEm)).toThrow(UnknownLayoutError);
    expect(() => setFormula(tex, halfEm)).toThrow(named);
  });

  test('an element of a new kind', () => {
    class Novelty {}
    expect(() => measureNode(new Novelty(), baseSetting, halfEm)).toThrow('layout element Novelty');
  });

  test('a property of a known element', () => {
    const symbol = new __domTree.SymbolNode('x');
    Object.assign(symbol.style, { letterSpacing: '1em' });
    expect(() => measureNode(symbol, baseSetting, halfEm)).toThrow('style "letterSpacing: 1em"');
  });

  test('a path command', () => {
    expect(() => parsePath('M0 0Q1 1 2 2')).toThrow('"Q"');
    expect(() => parsePath('M0 0L1')).toThrow('"L" has 1 values');
  });
});
