/** Mutants that compute the same as the book, with the reason; the pattern reads their ids. */
export const EQUIVALENT: readonly { readonly mutants: RegExp; readonly reason: string }[] = [];
