import type { BookSymbol } from '../../book.ts';

export const strength = {} as const satisfies Record<string, BookSymbol>;
