import { bookWriter } from '../book.ts';

/** ANSI/AISC 360-22, Specification for Structural Steel Buildings, August 1, 2022. */
export const BOOK = 'aisc360-22';
export const { formula, clause } = bookWriter(BOOK);
