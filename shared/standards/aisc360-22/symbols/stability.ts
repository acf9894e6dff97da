import type { BookSymbol } from '../../book.ts';

export const stability = {} as const satisfies Record<string, BookSymbol>;
