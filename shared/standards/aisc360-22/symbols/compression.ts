import type { BookSymbol } from '../../book.ts';

export const compression = {} as const satisfies Record<string, BookSymbol>;
