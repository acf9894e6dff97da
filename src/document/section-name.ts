/** A designation as it is printed: `W12×79` for the table's `W12X79`. */
export const sectionName = (designation: string): string =>
  designation.replace(/(?<=\d)x(?=\d)/gi, '×');
