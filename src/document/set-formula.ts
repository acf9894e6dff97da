import katex from 'katex';

const KEPT = 4_000;
const setAlready = new Map<string, string>();

/** HTML of a formula in KaTeX's fonts; `\htmlData` marks operands with the line they lead to. */
export function formulaHtml(tex: string): string {
  const known = setAlready.get(tex);
  if (known !== undefined) return known;
  const html = katex.renderToString(`\\displaystyle ${tex}`, {
    output: 'html',
    throwOnError: false,
    strict: (code: string) => (code === 'htmlExtension' ? 'ignore' : 'warn'),
    trust: ({ command }) => command === '\\htmlData',
  });
  if (setAlready.size >= KEPT) {
    const [oldest] = setAlready.keys();
    if (oldest !== undefined) setAlready.delete(oldest);
  }
  setAlready.set(tex, html);
  return html;
}

export const isSet = (tex: string): boolean => setAlready.has(tex);
