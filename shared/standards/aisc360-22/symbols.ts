import type { BookSymbol } from '../book.ts';
import { compression } from './symbols/compression.ts';
import { flexure } from './symbols/flexure.ts';
import { general } from './symbols/general.ts';
import { member } from './symbols/member.ts';
import { stability } from './symbols/stability.ts';
import { strength } from './symbols/strength.ts';

/** All symbols of the standard; throws where two chapters name one. */
export const symbols = merged(general, compression, flexure, strength, stability, member);

function merged(
  ...groups: readonly Readonly<Record<string, BookSymbol>>[]
): Readonly<Record<string, BookSymbol>> {
  const all: Record<string, BookSymbol> = {};
  for (const group of groups)
    for (const [name, symbol] of Object.entries(group)) {
      if (all[name]) throw new Error(`two symbols ${name}`);
      all[name] = symbol;
    }
  return Object.freeze(all);
}
