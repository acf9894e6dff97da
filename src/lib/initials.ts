/** `IM` for Ines Marlow. */
export const initials = (name: string): string =>
  name
    .split(/\s+/)
    .flatMap((word) => [...word].slice(0, 1))
    .join('')
    .toUpperCase();
