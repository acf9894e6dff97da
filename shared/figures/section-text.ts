import { printedDesignation } from '../sections/designation.ts';

/** A section's name as it is read: the table's `W12X79` is W12×79. */
export const sectionText = printedDesignation;
