import type { BookSymbol } from '../../book.ts';

export const flexure = {} as const satisfies Record<string, BookSymbol>;
