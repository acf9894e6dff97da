import type { LayoutStyle } from 'katex';

/** Thrown for a piece of KaTeX's layout that `math/` doesn't know how to set. */
export class UnknownLayoutError extends Error {
  constructor(what: string) {
    super(`mathematics: ${what} is not known to the setter`);
    this.name = 'UnknownLayoutError';
  }
}

/** A length in em as KaTeX writes it (`-2.55em`); 0 where it isn't set. */
export function em(style: LayoutStyle, property: string): number {
  const text = style[property];
  if (text === undefined) return 0;
  const match = /^(-?[\d.]+)em$/.exec(text);
  if (!match) throw new UnknownLayoutError(`length "${property}: ${text}"`);
  return Number(match[1]);
}

/** Throws if a style sets anything but the named properties. */
export function allowStyle(style: LayoutStyle, properties: readonly string[]): void {
  for (const [property, value] of Object.entries(style)) {
    if (value !== undefined && !properties.includes(property)) {
      throw new UnknownLayoutError(`style "${property}: ${value}"`);
    }
  }
}
