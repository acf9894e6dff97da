/** `1 member`, `3 members`; the plural is the singular with an s unless given. */
export const count = (n: number, one: string, many = `${one}s`): string =>
  `${n} ${n === 1 ? one : many}`;
