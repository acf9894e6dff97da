import { bookWriter } from '../book.ts';

/** Mechanics of solids: properties of sections welded from plates and of tubes, from their sizes. */
export const BOOK = 'section-properties';
export const { formula, clause } = bookWriter(BOOK);
