import { bookWriter } from '../book.ts';

/** Second-order theory of the elastic, prismatic member; pinned ends, small rotations, no twist. */
export const BOOK = 'elastic-theory';
export const { formula, clause } = bookWriter(BOOK);
